import { neverAbove, pourWindow } from '#shared/pour/window.ts';
import type { YeastFacts } from '#shared/rules/facts.ts';
import type { HouseRules } from '#shared/rules/resolve.ts';
import { format } from '#shared/units/quantity.ts';
import { temperatureRange } from '../../../app/rangeWords.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { SheetPart } from './SheetPart.tsx';

/** The temperatures at which the wort may go onto the cake, and whose word that is. */
export function PourWindowPart({ yeast, rules }: { yeast: YeastFacts; rules: HouseRules }) {
  const { units } = useBoardView();
  const { minC, maxC, own } = pourWindow(yeast);
  const limit = neverAbove(yeast);
  const step = (c: number) => format('temperatureStep', c, units);
  return (
    <SheetPart title="Temperature window of the wort">
      <p className="text-[1.35em] leading-tight font-bold">
        {unbroken(temperatureRange(minC, maxC, units) ?? '')}
      </p>
      <p>
        {own
          ? "The yeast's own range, as written down for it."
          : `Usual for ${yeast.kind} yeast (common practice): the range that the yeast's maker gives goes first.`}
      </p>
      <p>
        {unbroken(
          `Up to ${step(rules.pourAboveMind)} above: harsher alcohols. Up to ${step(rules.pourBelowMind)} below: a slow start. Further out: do not pour. At ${format('temperature', limit.c, units)} and above the wort kills the yeast.`,
        )}
      </p>
    </SheetPart>
  );
}
