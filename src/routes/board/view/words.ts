import type { Batch } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { Yeast } from '#shared/api/yeast.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { daysBetween, formatDayShort } from '#shared/units/day.ts';
import { points } from '#shared/units/gravity.ts';
import { format, formatBare } from '#shared/units/quantity.ts';
import { lowered } from '../../../app/lowered.ts';

export const count = (n: number, one: string, many = `${one}s`): string =>
  `${n} ${n === 1 ? one : many}`;

/** Original gravity as read, else as planned. */
export const ogOf = (batch: Batch): number | null => batch.read.og ?? batch.og;
/** Final gravity as read, else as planned. */
export const fgOf = (batch: Batch): number | null => batch.read.fg ?? batch.fg;
/** Volume as read, else as planned, litres. */
export const volumeOf = (batch: Batch): number | null => batch.read.volumeL ?? batch.volumeL;

/** "Racked 20 Mar", "Fermenting, day 9", "Pencilled". */
export function stageLine(batch: Batch, today: Day): string {
  switch (batch.stage) {
    case 'pencilled':
      return 'Pencilled';
    case 'scrapped':
      return 'Scrapped';
    case 'racked':
      return batch.read.rackedOn ? `Racked ${formatDayShort(batch.read.rackedOn)}` : 'Racked';
    case 'fermenting': {
      const day = batch.brewOn === null ? null : daysBetween(batch.brewOn, today);
      return day === null || day < 0 ? 'Fermenting' : `Fermenting, day ${day}`;
    }
  }
}

/** The first days after the pour, when a beer stands under foam. */
export function isFoaming(batch: Batch, today: Day): boolean {
  if (batch.stage !== 'fermenting' || batch.brewOn === null) return false;
  const day = daysBetween(batch.brewOn, today);
  return day >= 0 && day <= 3;
}

interface Totals {
  onShelves: number;
  chains: number;
  packs: number;
  hold: number;
}

/** "8 batches on 3 cakes · 3 packs to buy · one link on hold". */
export function seasonLine(totals: Totals): string {
  const held =
    totals.hold === 0
      ? 'no link on hold'
      : totals.hold === 1
        ? 'one link on hold'
        : `${totals.hold} links on hold`;
  return [
    `${count(totals.onShelves, 'batch', 'batches')} on ${count(totals.chains, 'cake')}`,
    `${count(totals.packs, 'pack')} to buy`,
    held,
  ].join(' · ');
}

/** "clean ale · 18–22 °C"; without a range only the kind. */
export function yeastLine(yeast: Yeast, units: UnitPrefs): string {
  const kind = yeast.character ? `${yeast.kind}, marked character` : yeast.kind;
  const words = yeast.kind === 'ale' && !yeast.character ? 'clean ale' : kind;
  const { fermentMinC, fermentMaxC } = yeast;
  if (fermentMinC === null || fermentMaxC === null) return words;
  const low = formatBare('temperature', fermentMinC, units);
  return `${words} · ${low}–${format('temperature', fermentMaxC, units)}`;
}

/** "generation 1–4 of 7". */
export function generationLine(
  generations: readonly [number, number] | null,
  limit: number,
): string {
  if (generations === null) return `no batch yet, up to ${limit} generations`;
  const [first, last] = generations;
  return `generation ${first === last ? first : `${first}–${last}`} of ${limit}`;
}

const signed = (n: number) => `${n < 0 ? '−' : '+'}${Math.abs(n)}`;

/** Change of gravity from one beer to the next: "+8 points", or in °P; empty where unknown. */
export function gravityStep(earlier: Batch, later: Batch, units: UnitPrefs): string {
  const from = ogOf(earlier);
  const to = ogOf(later);
  if (from === null || to === null) return '';
  if (units.gravity === 'sg') {
    const step = Math.round(points(to)) - Math.round(points(from));
    return `${signed(step)} ${Math.abs(step) === 1 ? 'point' : 'points'}`;
  }
  const plato = (sg: number) => Number(formatBare('gravity', sg, units).replace(',', '.'));
  const step = Math.round((plato(to) - plato(from)) * 10) / 10;
  return `${signed(step)} °P`;
}

/** Findings that the verdict counts: the holds of a Hold, the minds of a Mind. */
export const countedFindings = (link: Pick<LinkAnswer, 'verdict' | 'findings'>): number =>
  link.findings.filter((finding) => finding.verdict === link.verdict).length;

/** Two to four words under a band: the worst finding, or the step in gravity when it may be poured. */
export function shortReason(link: LinkAnswer, step: string): string {
  const worst = link.findings.find((f) => f.verdict === 'hold') ?? link.findings[0];
  if (!worst) return step;
  return lowered(worst.title);
}

/** "1.052 · 7 SRM · 38 IBU"; what is unknown is left out. */
export function beerFacts(batch: Batch, units: UnitPrefs): { gravity: string; rest: string[] } {
  const og = ogOf(batch);
  const rest: string[] = [];
  rest.push(batch.srm === null ? 'colour unknown' : format('colour', batch.srm, units));
  if (batch.ibu !== null) rest.push(format('bitterness', batch.ibu, units));
  return { gravity: og === null ? 'gravity unknown' : gravityText(og, units), rest };
}

/** Specific gravity is read without a unit; degrees Plato with it. */
export const gravityText = (sg: number, units: UnitPrefs): string =>
  units.gravity === 'sg' ? formatBare('gravity', sg, units) : format('gravity', sg, units);
