import type { LinkInput } from '../rules/linkInput.ts';
import { daysBetween } from '../units/day.ts';
import type { BoardFacts } from './board.ts';
import { sightOf } from './boardLink.ts';
import { linkInput } from './linkInput.ts';

/**
 * The batches whose accepted link is no longer the one that was accepted: a fact of it, or its
 * place in the descent of the yeast, differs between the two boards. Names and a shift of the
 * whole link in the calendar change nothing that was accepted.
 */
export function lapses(before: BoardFacts, after: BoardFacts): string[] {
  const accepted = after.batches.filter((batch) => batch.link.acceptance !== null);
  if (accepted.length === 0) return [];
  const [was, is] = [sightOf(before), sightOf(after)];
  return accepted.flatMap(({ id }) => {
    const [old, now] = [linkInput(id, was), linkInput(id, is)];
    return old && now && gist(old) === gist(now) ? [] : [id];
  });
}

/** A link's facts as text, as an acceptance speaks of them; null where there is no link. */
export function linkGist(board: BoardFacts, batchId: string): string | null {
  const input = linkInput(batchId, sightOf(board));
  return input && gist(input);
}

/** A link's facts as text, its days counted from each other. */
function gist(input: LinkInput): string {
  const { earlier, later, pour, board, inherited, rules: _, units: __, ...rest } = input;
  const { name: _a, brewOn: brewedOn, ...earlierFacts } = earlier;
  const { name: _b, brewOn, ...laterFacts } = later;
  const { takenOn, sharedWith = [], ...pourFacts } = pour;
  return JSON.stringify({
    ...rest,
    inherited: {
      ...inherited,
      allergens: inherited.allergens.toSorted(),
      cultures: inherited.cultures.toSorted(),
    },
    earlier: earlierFacts,
    later: laterFacts,
    pour: pourFacts,
    shared: sharedWith.map(({ litres }) => litres),
    taken: board?.vesselTakenBy !== undefined,
    cakeCheck: spoken(board?.cakeCheck),
    untilTaken: between(brewedOn, takenOn),
    untilBrewed: between(brewedOn, brewOn),
    // With no day to count from, the day itself is the fact.
    days: brewedOn === undefined ? [takenOn, brewOn] : [],
  });
}

/** Readings of which none warns say no more than none. */
const spoken = (check: NonNullable<LinkInput['board']>['cakeCheck']) =>
  check && {
    ...check,
    fermentationStuck: check.fermentationStuck || undefined,
    noticed: check.noticed?.length ? check.noticed : undefined,
  };

const between = (from: string | undefined, to: string | undefined): number | null =>
  from === undefined || to === undefined ? null : daysBetween(from, to);
