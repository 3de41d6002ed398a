import type { CommentAbout } from '../api/comment.ts';

/** What somebody did with a comment. */
export type Talked = 'said' | 'changed' | 'removed' | 'put-back';

/** Of what it speaks: "the shelf Harbour ale", "the link to Keel", "Keel". */
export const aboutWords = (about: CommentAbout['kind'], name: string): string =>
  about === 'chain' ? `the shelf ${name}` : about === 'link' ? `the link to ${name}` : name;

/** The words themselves stay out of the record: they can be taken back, and a record cannot. */
export function tellTalk(did: Talked, about: string): string {
  switch (did) {
    case 'said':
      return `Said something about ${about}`;
    case 'changed':
      return `Changed a comment about ${about}`;
    case 'removed':
      return `Removed a comment about ${about}`;
    case 'put-back':
      return `Put a removed comment about ${about} back`;
  }
}
