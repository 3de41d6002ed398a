import { unitOf } from '#shared/units/quantity.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { fgOf, gravityText } from '../../board/view/words.ts';
import type { SheetOf } from './sheetOf.ts';
import { Blank, Box, SheetPart, Tick } from './SheetPart.tsx';

/** The brew day in its order, each step with a box to tick and room for what was read. */
export function BrewDayChecks({ earlier, later, link }: SheetOf) {
  const { units } = useBoardView();
  const fg = fgOf(earlier);
  const degrees = unitOf('temperature', units);
  const gravity = units.gravity === 'sg' ? '' : ` ${unitOf('gravity', units)}`;
  const [litres, small] = [unitOf('volume', units), unitOf('mass', units)];
  const advised = link.advice.filter(({ id }) => IN_ORDER.includes(id));
  return (
    <SheetPart title="On the brew day">
      <ol>
        <Tick>
          <b>{earlier.name} is finished</b>: two readings 48 hours apart agree within 0.001
          {fg !== null && `, near ${gravityText(fg, units)}`}: <Blank />
          {gravity} and <Blank />
          {gravity}
        </Tick>
        <Tick>
          <b>Tasted</b>: clean <Box /> off <Box /> <Blank wide />
        </Tick>
        <Tick>
          <b>Racked</b> while the wort chills, at <Blank />
        </Tick>
        <Tick>
          <b>Cake</b>: there is <Blank /> {litres} or <Blank /> {small}; kept <Blank />
        </Tick>
        <Tick>
          <b>Cleaned and sanitised</b>: everything that touches wort or cake from here on
        </Tick>
        <Tick>
          <b>Wort temperature</b>, stirred: <Blank /> {degrees} at <Blank />, then <Blank />{' '}
          {degrees} at <Blank />
        </Tick>
        <Tick>
          <b>Poured</b> at <Blank />: volume <Blank /> {litres}, gravity <Blank />
          {gravity}, cake at <Blank /> {degrees}
        </Tick>
        <Tick>
          <b>Aerated</b> or given oxygen
          {advised.length > 0 && `. ${advised.map(({ text }) => text).join(' ')}`}
        </Tick>
        <Tick>
          <b>Lid on, blow-off fitted</b> and its end under liquid, nothing sealed
        </Tick>
      </ol>
      <p className="mt-1">
        {later.notes === '' ? 'Notes' : `Notes: ${later.notes}`}
        <span aria-hidden className="mt-[1.5em] block border-b border-ink" />
        <span aria-hidden className="mt-[1.7em] block border-b border-ink" />
      </p>
    </SheetPart>
  );
}

/** Advice on what is done after the pour stands beside the step. */
const IN_ORDER = ['oxygen', 'second-oxygen'];
