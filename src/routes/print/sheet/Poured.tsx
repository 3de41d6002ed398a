import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { vesselOf } from '../../board/view/drawing.ts';
import { beerFacts, fgOf, gravityText, volumeOf } from '../../board/view/words.ts';
import type { SheetOf } from './sheetOf.ts';
import { SheetPart } from './SheetPart.tsx';

/** Which wort goes onto which cake, in which vessel, and what the two make together. */
export function Poured({ earlier, later, link }: SheetOf) {
  const { index, judged, units } = useBoardView();
  const volume = volumeOf(later);
  const fg = fgOf(earlier);
  const racked = judged.rackOn.get(earlier.id);
  const vessel = vesselOf(later, index);
  const { gravity, rest } = beerFacts(later, units);
  const wort = [
    later.style,
    volume === null ? 'volume unknown' : format('volume', volume, units),
    gravity,
    ...rest,
  ];
  const onto = [
    `the cake of ${earlier.name}`,
    ...(fg === null ? [] : [`final gravity ${gravityText(fg, units)}`]),
    ...(racked ? [`racking ${formatDay(racked)}`] : []),
  ];
  const { og, srm, ibu } = link.blend;
  const blended = [
    ...(og === null ? [] : [gravityText(og, units)]),
    ...(srm === null ? [] : [format('colour', srm, units)]),
    ...(ibu === null ? [] : [format('bitterness', ibu, units)]),
  ];
  return (
    <SheetPart title="What goes onto what">
      <p>
        <b>Pour {later.name}</b>: {unbroken(wort.filter(Boolean).join(', '))}
      </p>
      <p>
        <b>onto</b> {unbroken(onto.join(', '))}
      </p>
      <p>
        <b>in</b>{' '}
        {vessel
          ? `${vessel.name}, ${format('volume', vessel.capacityL, units)}${vessel.blowOff ? ', blow-off tube' : ''}`
          : 'a vessel that nobody has named yet'}
      </p>
      {blended.length > 0 && <p>As poured: {unbroken(blended.join(', '))}</p>}
    </SheetPart>
  );
}
