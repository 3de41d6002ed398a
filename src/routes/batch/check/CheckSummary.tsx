import type { CakeCheck } from '#shared/api/cakeCheck.ts';
import { massOf } from '#shared/cake/measured.ts';
import { format } from '#shared/units/quantity.ts';
import { cellsPerMl, viability, viabilityInterval } from '#shared/yeast/counting.ts';
import { dayAndTime } from '../../../app/zonedTime.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { Facts, type Fact } from '../../../components/ui/Facts.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { COLOUR_WORDS, FAULT_WORDS, FIT_WORDS, LAYER_WORDS, SMELL_WORDS } from './checkWords.ts';

/** What was signed of a cake. */
export function CheckSummary({ check }: { check: CakeCheck }) {
  const { board } = useBoardView();
  const { timeZone } = board.brewery;
  const { word, verdict } = FIT_WORDS[check.judged];
  return (
    <div className="space-y-4">
      <VerdictPill verdict={verdict} word={word} large />
      <p className="text-small text-ink2">
        Signed by {check.signedBy.name}, {dayAndTime(check.signedAt, timeZone)}
      </p>
      <Facts facts={useFacts(check)} />
      {check.notes && <p className="wrap-anywhere whitespace-pre-wrap">{check.notes}</p>}
      <p className="text-small text-ink2">
        What was measured here stands in place of the estimate in every later verdict.
      </p>
    </div>
  );
}

function useFacts(check: CakeCheck): Fact[] {
  const { units } = useBoardView();
  const mass = massOf(check);
  const faults = check.faults.map((one) => FAULT_WORDS[one]).join(', ');
  const all: (Fact | null)[] = [
    { term: 'Beer', value: check.tasted === 'clean' ? 'clean' : `off${faults && `: ${faults}`}` },
    check.volumeL === null
      ? null
      : { term: 'Volume', value: format('volume', check.volumeL, units) },
    mass === null ? null : { term: 'Mass', value: format('mass', mass, units) },
    check.layers && { term: 'Layers', value: LAYER_WORDS[check.layers] },
    check.colour && { term: 'Colour', value: COLOUR_WORDS[check.colour].label },
    check.smells.length === 0
      ? null
      : { term: 'Smell', value: check.smells.map((one) => SMELL_WORDS[one]).join(', ') },
    ...countFacts(check),
  ];
  return all.flatMap((fact) => fact ?? []);
}

function countFacts({ count }: CakeCheck): Fact[] {
  if (!count) return [];
  const { living, dead, squares, dilution } = count;
  const { low, high } = viabilityInterval(living, dead);
  const percent = (share: number) => Math.round(share * 100);
  const cells = (cellsPerMl(living + dead, squares, dilution) / 1e9).toPrecision(2);
  return [
    {
      term: 'Alive',
      value: `${percent(viability(living, dead))} % (${percent(low)}–${percent(high)} %), ${living + dead} cells counted`,
    },
    { term: 'Density', value: `${cells} billion cells/mL` },
  ];
}
