import type { UnitPrefs } from '#shared/api/units.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { CAKE_KG_PER_L } from '#shared/cake/estimate.ts';
import { format } from '#shared/units/quantity.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { spanWords, thumbWords } from '../../board/panel/keepWords.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import type { SheetOf } from './sheetOf.ts';
import { SheetPart } from './SheetPart.tsx';

/** How much of the cake stays, by volume and by weight, and where the rest goes. */
export function CakeToKeep({ earlier, link }: SheetOf) {
  const { units } = useBoardView();
  const { cake } = link;
  if (cake.volumeL === null)
    return (
      <SheetPart title="How much cake to keep">
        <p>
          It cannot be estimated before volume and gravities of {earlier.name} are known. Weigh or
          measure the cake.
        </p>
      </SheetPart>
    );
  const keptL = link.keep.keptL ?? cake.volumeL;
  const whole = keptL >= cake.volumeL * 0.999;
  const kg = keptL * kgPerLitre(link);
  const thumb = thumbWords(link, units);
  return (
    <SheetPart title="How much cake to keep">
      <p className="text-[1.35em] leading-tight font-bold">
        {whole ? 'All of it, about ' : ''}
        {unbroken(`${format('smallVolume', keptL, units)} or ${format('smallMass', kg, units)}`)}
      </p>
      <p>{unbroken(wholeWords(link, units))}</p>
      {thumb && <p>{unbroken(thumb)}</p>}
      {!whole && <p>{restWords(link)}</p>}
    </SheetPart>
  );
}

/** A cake that was weighed and measured has a density of its own. */
const kgPerLitre = ({ cake: { massKg, volumeL } }: LinkAnswer): number =>
  massKg === null || !volumeL ? CAKE_KG_PER_L : massKg / volumeL;

function wholeWords(link: LinkAnswer, units: UnitPrefs): string {
  const { volumeL, massKg, volumeInterval, measured } = link.cake;
  if (volumeL === null) return '';
  const kg = massKg ?? volumeL * CAKE_KG_PER_L;
  const all = `Of about ${format('smallVolume', volumeL, units)} or ${format('mass', kg, units)}`;
  if (measured) return `${all}, as measured.`;
  if (!volumeInterval) return `${all}, an estimate.`;
  const { low, high } = volumeInterval;
  const weighs = (litres: number) => format('mass', litres * kgPerLitre(link), units);
  return `${all}, an estimate: nine times in ten it is ${spanWords({ low, high }, units)}, ${weighs(low)} to ${weighs(high)}.`;
}

/** The rest is jarred or dumped; either way something is to be said of it. */
function restWords({ advice }: LinkAnswer): string {
  const jar = advice.find(({ id }) => id === 'jar-the-rest');
  return `${jar ? `${jar.text} ` : ''}Write strain, generation, date and allergens on a jar; dumped cake is dangerous to dogs.`;
}
