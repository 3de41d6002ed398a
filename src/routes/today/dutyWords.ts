import type { Abilities } from '#shared/api/people.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { BoardIndex } from '#shared/chain/board.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import type { Duty } from '#shared/today/duty.ts';
import { HOP_DAYS } from '#shared/today/hops.ts';
import { daysBetween, formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { lowered } from '../../app/lowered.ts';
import { unbroken } from '../../app/unbroken.ts';

export interface DutyWords {
  title: string;
  /** Why, or what to mind; may be empty. */
  because: string;
  /** The word on the button, and the page in this brewery that it leads to. */
  action: string;
  page: string;
  caution?: string;
}

interface Sight {
  index: BoardIndex;
  units: UnitPrefs;
  today: Day;
  can: Abilities;
}

/** What a duty is called, and the one tap that leads to it. */
export function dutyWords(duty: Duty, sight: Sight): DutyWords {
  const { index, units, can } = sight;
  const nameOf = (id: string) => index.batch(id)?.name ?? 'a batch that is gone';
  const name = nameOf(duty.batchId);
  const batchPage = `batches/${duty.batchId}`;
  const pourPage = `pour/${duty.batchId}`;
  switch (duty.kind) {
    case 'override':
      return {
        title: `Leave to pour ${name} is asked for`,
        because: `${duty.askedBy} asks${duty.holds === '' ? '' : `: ${lowered(duty.holds)}`}.`,
        action: can.acceptHolds ? 'Answer' : 'See it',
        page: pourPage,
      };
    case 'pour-open':
      return {
        title: `The pour of ${name} is in hand`,
        because: `${duty.heldBy} holds it.`,
        action: 'Go to the pour',
        page: pourPage,
      };
    case 'signature':
      return {
        title: `The pour of ${name} had no leave`,
        because: 'It stays red until a head brewer signs a reason.',
        action: can.acceptHolds ? 'Sign it' : 'See it',
        page: pourPage,
      };
    case 'take-yeast':
      return {
        title: `Take the yeast of ${name}`,
        because: `It goes under ${nameOf(duty.forId)}.`,
        action: 'Write it down',
        page: batchPage,
      };
    case 'dry-hop':
      return { ...hopWords(duty, name, nameOf, units), action: 'Write it down', page: batchPage };
    case 'rack':
      return { ...rackWords(duty, name, sight), action: 'Rack it', page: batchPage };
    case 'cake-check':
      return {
        title: `Check the cake of ${name}`,
        because: `${nameOf(duty.forId)} is to go onto it. Taste the beer first.`,
        action: 'Check the cake',
        page: batchPage,
      };
    case 'brew':
      return {
        title: `Brew ${name}`,
        because:
          duty.ontoId === null ? 'With fresh yeast.' : `Onto the cake of ${nameOf(duty.ontoId)}.`,
        action: duty.ontoId === null ? 'To the pour' : 'Pour check',
        page: pourPage,
      };
    case 'jar':
      return {
        title: `Put yeast of ${name} into a jar`,
        because: unbroken(
          `${duty.volumeL === null ? '' : `${format('volume', duty.volumeL, units)}, `}generation ${duty.generation}.`,
        ).replace(/^g/, 'G'),
        action: `Open ${name}`,
        page: batchPage,
        caution: 'Keep the lid loose: yeast at work makes gas.',
      };
    case 'reading':
      return { ...readingWords(duty, name, sight), action: 'Write a reading', page: batchPage };
    case 'event':
      return {
        title: duty.text === '' ? `Addition to ${name}` : `${duty.text}: ${name}`,
        because: '',
        action: 'Write it down',
        page: batchPage,
      };
  }
}

function hopWords(
  duty: Duty & { kind: 'dry-hop' },
  name: string,
  nameOf: (id: string) => string,
  units: UnitPrefs,
) {
  const amount = duty.gramsPerLitre > 0 ? `${rateWords(duty.gramsPerLitre, units)}. ` : '';
  const first =
    duty.yeastFirst === null
      ? ''
      : `Take the yeast first: ${nameOf(duty.yeastFirst)} goes onto it without the hops. `;
  const usual = duty.isUsualDay
    ? `No day is planned; ${HOP_DAYS} days before racking is common practice.`
    : '';
  return { title: `Dry-hop ${name}`, because: unbroken(`${first}${amount}${usual}`.trim()) };
}

const rateWords = (gramsPerLitre: number, units: UnitPrefs) =>
  format('hopRate', gramsPerLitre, units);

function rackWords(duty: Duty & { kind: 'rack' }, name: string, { index, today }: Sight) {
  const batch = index.batch(duty.batchId);
  const days = batch?.brewOn ? daysBetween(batch.brewOn, today) : null;
  const mates = batch?.chainId ? index.batchesOf(batch.chainId) : [];
  const next = mates[mates.findIndex(({ id }) => id === duty.batchId) + 1];
  const since = days === null || days < 1 ? '' : `Fermenting, day ${days}. `;
  return {
    title: `Rack ${name}`,
    because: `${since}${next ? `${next.name} goes onto its cake.` : ''}`.trim(),
  };
}

function readingWords(duty: Duty & { kind: 'reading' }, name: string, { today }: Sight) {
  if (duty.lastOn === null)
    return { title: `Read ${name}`, because: 'Nothing has been read of it yet.' };
  const ago = daysBetween(duty.lastOn, today);
  const when =
    ago < 1 ? 'today' : ago === 1 ? 'yesterday' : `on ${formatDay(duty.lastOn)}, ${ago} days ago`;
  return { title: `Read ${name}`, because: `Last read ${when}.` };
}
