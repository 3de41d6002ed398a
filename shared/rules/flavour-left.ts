import type { Addition } from './facts.ts';
import { namesOf } from './names.ts';
import { hold, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { listed } from './say.ts';
import type { AdditionKind } from './vocabulary.ts';
import { ADDITION_WORDS, capital } from './words.ts';

const STAYS: readonly AdditionKind[] = ['fruit', 'spice', 'coffee', 'vanilla', 'wood', 'lactose'];
const STAYS_LOUD: readonly AdditionKind[] = ['smoke', 'chilli'];

interface Detail {
  left: AdditionKind[];
}

/** A flavour that went in before the yeast was taken, and that B does not have. */
export const flavourLeft: Rule<Detail> = {
  id: 'flavour-left',

  judge({ a, b }) {
    if (a.additions === undefined) return unchecked(['additions']);
    const stays = flavours(a.additions);
    if (stays.length === 0) return PASSED;
    const own = b.additions;
    if (own === undefined) return unchecked(['additions']);
    const left = stays.filter((what) => !own.some((addition) => addition.what === what));
    if (left.some((what) => STAYS_LOUD.includes(what))) return hold({ left });
    return left.length > 0 ? mind({ left }) : PASSED;
  },

  describe({ detail: { left } }, link) {
    const { a, b } = namesOf(link);
    const what = listed(left.map((one) => ADDITION_WORDS[one]));
    const went = left.length > 1 ? 'go' : 'goes';
    return {
      title: `${capital(left.length === 1 ? what : 'flavours')} left behind`,
      because: `${capital(what)} ${went} into ${a} before its yeast is taken, and ${b} has none.`,
      do: `Take the yeast of ${a} before the ${what} ${went} in.`,
      measures: [],
      basis: 'Common practice',
    };
  },
};

/** Each flavour that reached the cake, once. */
function flavours(additions: readonly Addition[]): AdditionKind[] {
  const stays: AdditionKind[] = [];
  for (const { what, timing } of additions)
    if (timing === 'on-cake' && (STAYS.includes(what) || STAYS_LOUD.includes(what)))
      if (!stays.includes(what)) stays.push(what);
  return stays;
}
