import {
  ETHANOL_DENSITY,
  EXTRACT_PER_ALCOHOL,
  EXTRACT_PER_PLATO,
  SHARE_APPARENT,
  SHARE_ORIGINAL,
} from '#shared/units/alcohol.ts';
import { EXTRACT_FIT, platoFromSg, sgFromPlato } from '#shared/units/gravity.ts';
import { Formula, Over } from '../Formula.tsx';
import { digits, inBoth, percent, plato, result, signed, type ScienceSection } from '../section.ts';

const [C0, C1, C2, C3] = EXTRACT_FIT;

export const gravity: ScienceSection = {
  id: 'gravity',
  title: 'Gravity and degrees Plato',
  lead: 'How much extract is in a wort of a specific gravity. Beers are set in order by points of gravity, cells are counted by °P.',
  formula: (
    <>
      <Formula
        say={`P equals ${C0} plus ${C1} times S G, minus ${-C2} times S G squared, plus ${C3} times S G cubed`}
      >
        <i>P</i> = {signed(C0)} + {C1} <i>SG</i> {signed(C2)} <i>SG</i>
        <sup>2</sup> + {C3} <i>SG</i>
        <sup>3</sup>
      </Formula>
      <Formula say="Points equal S G minus 1, times 1000">
        points = (<i>SG</i> − 1) × 1000
      </Formula>
      <p>Back from °P to gravity, the same curve is solved by Newton’s method.</p>
    </>
  ),
  source:
    'A fit of third degree to the extract table of the ASBC Methods of Analysis, its coefficients from memory. Tested against the sucrose tables of Asadi, Beet-Sugar Handbook, Wiley 2007, table A.1, and of the USDA, file code 135-A-50.',
  interval: 'Within 0.003 °P of both tables from 0 to 21 °P.',
  limits:
    'Trusted from 1.000 to 1.110. Above 25 °P the published curves part by about 0.0001 SG. A gravity is at 20 °C; a beer’s is its apparent extract, because alcohol makes it lighter.',
  figures: ({ link: { a, b, pointsA, pointsB }, earlier, later, units }) => [
    { what: `Original gravity of ${earlier}`, value: inBoth('gravity', a.og, units) },
    result(
      `Extract of ${earlier}`,
      plato(a.og === undefined ? undefined : platoFromSg(a.og)),
      'plato-earlier',
    ),
    { what: `Original gravity of ${later}`, value: inBoth('gravity', b.og, units) },
    result(
      `Extract of ${later}`,
      plato(b.og === undefined ? undefined : platoFromSg(b.og)),
      'plato-later',
    ),
    {
      what: 'And back',
      value: b.og === undefined ? null : `SG ${sgFromPlato(platoFromSg(b.og)).toFixed(4)}`,
    },
    result(
      `From ${earlier} to ${later}`,
      pointsA === undefined || pointsB === undefined
        ? null
        : `${digits(pointsB - pointsA, 4)} points`,
      'points',
    ),
  ],
};

export const alcohol: ScienceSection = {
  id: 'alcohol',
  title: 'Alcohol',
  lead: 'How much alcohol the yeast of the cake stood in. A strong beer leaves a tired cake.',
  formula: (
    <>
      <Formula say={`R E equals ${SHARE_ORIGINAL} O E plus ${SHARE_APPARENT} A E`}>
        <i>RE</i> = {SHARE_ORIGINAL} <i>OE</i> + {SHARE_APPARENT} <i>AE</i>
      </Formula>
      <Formula
        say={`A equals O E minus R E, over ${EXTRACT_PER_ALCOHOL} minus ${EXTRACT_PER_PLATO} O E`}
      >
        <i>A</i> =
        <Over
          top={
            <>
              <i>OE</i> − <i>RE</i>
            </>
          }
          bottom={
            <>
              {EXTRACT_PER_ALCOHOL} − {EXTRACT_PER_PLATO} <i>OE</i>
            </>
          }
        />
      </Formula>
      <Formula say={`A B V equals A times final S G over ${ETHANOL_DENSITY}`}>
        <i>ABV</i> ={' '}
        <Over
          top={
            <>
              <i>A</i> × <i>FG</i>
            </>
          }
          bottom={ETHANOL_DENSITY}
        />
      </Formula>
      <p>
        OE is the original and AE the apparent extract, RE the real one, all in °P; A is alcohol by
        weight.
      </p>
    </>
  ),
  source:
    'Balling 1865 (2.0665 g of extract give 1 g of alcohol), as in ASBC Beer-4 and Beer-6; numbers from memory. Tested against the measured beers of Cutaia, Reid and Speers 2009, J. Inst. Brew. 115:318–327, table III.',
  interval: 'The means of five published sets of beers are met within 0.12 % by weight.',
  limits:
    'One beer may be further out than a mean. It knows nothing of alcohol that was added or of sugar added later.',
  figures: ({ alcohol: worked, link: { a }, earlier, units }) => [
    {
      what: (
        <>
          <i>OE</i> of {earlier}
        </>
      ),
      value: plato(worked?.oe),
    },
    {
      what: (
        <>
          <i>AE</i>, from its final gravity{' '}
          {a.fg === undefined ? '' : inBoth('gravity', a.fg, units)}
        </>
      ),
      value: plato(worked?.ae),
    },
    { what: <i>RE</i>, value: plato(worked?.re) },
    {
      what: (
        <>
          <i>A</i>, by weight
        </>
      ),
      value: worked ? `${digits(worked.byWeight)} %` : null,
    },
    result(
      'Alcohol by volume',
      worked && percent(worked.abv / 100) ? `${worked.abv.toFixed(1)} % ABV` : null,
      'abv',
    ),
  ],
};
