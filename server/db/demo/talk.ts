/** What the people of the demo say about this season's chains, oldest first. */
export interface DemoComment {
  by: 'Mo' | 'Tamsin' | 'Ruth';
  chain: string;
  /** The batch, or the later one of a link; absent: the chain. */
  batch?: string;
  about: 'chain' | 'link' | 'batch';
  /** Days before today. */
  daysAgo: number;
  text: string;
}

export const DEMO_TALK: readonly DemoComment[] = [
  {
    by: 'Tamsin',
    chain: 'Harbour ale',
    batch: 'Low Tide Blonde',
    about: 'batch',
    daysAgo: 13,
    text: 'Cake came off clean and firm, pale cream, smells of bread. Used half of it.',
  },
  {
    by: 'Ruth',
    chain: 'Harbour ale',
    batch: 'Low Tide Blonde',
    about: 'batch',
    daysAgo: 6,
    text: 'Tasted it on Sunday: soft, a little honey, no diacetyl. I would drink this all spring.',
  },
  {
    by: 'Mo',
    chain: 'Harbour ale',
    batch: 'Slack Water',
    about: 'link',
    daysAgo: 4,
    text: 'A small bitter after a double IPA is asking for trouble. Shall we brew Slack Water before Breakwater?',
  },
  {
    by: 'Tamsin',
    chain: 'Harbour ale',
    batch: 'Slack Water',
    about: 'link',
    daysAgo: 3,
    text: 'Yes, swap them. Then the hops come last and we dump that cake.',
  },
  {
    by: 'Tamsin',
    chain: 'Lantern lager',
    about: 'chain',
    daysAgo: 2,
    text: 'The cellar is down to 11 °C and holds. No hurry with this one.',
  },
  {
    by: 'Ruth',
    chain: 'Ropewalk stout',
    about: 'chain',
    daysAgo: 1,
    text: 'Keep me a few bottles of Night Watch for the club, please.',
  },
];
