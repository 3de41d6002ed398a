import { BEER_IN_CAKE } from '#shared/cake/blend.ts';
import { READING_ERROR_C } from '#shared/pour/coolingFit.ts';
import { thumbKg } from '#shared/cake/keep.ts';
import { temperatureRange } from '../../../app/rangeWords.ts';
import { Formula, Over } from '../Formula.tsx';
import { digits, inBoth, percent, result, type ScienceSection } from '../section.ts';

export const keep: ScienceSection = {
  id: 'keep',
  title: 'How much to keep',
  lead: 'The part of the cake that meets the need even at the low end of the estimate.',
  formula: (
    <>
      <Formula say="Part to keep equals the cake times the need over the living cells at the low end, at most all of it">
        part = cake ×
        <Over top="need" bottom="living cells, low end" />≤ cake
      </Formula>
      <Formula say="Ratio equals living cells in the kept part over the need">
        ratio =
        <Over top="living cells kept" bottom="need" />
      </Formula>
    </>
  ),
  source:
    'Arithmetic on the two estimates above. The trade’s rule of thumb, 10 to 17 g of slurry a litre of ale up to 17 °P and 20 to 27 above, twice that for lagers, is common practice.',
  interval:
    'The low end is one in twenty: more is in the cake nineteen times of twenty. That is why ours is often more than the rule of thumb.',
  limits: 'It takes the cells to be evenly spread. Discard the darkest layer first.',
  figures: ({ link: { cake, need, recommended, kept, b, yeast }, units }) => [
    {
      what: 'Need ÷ living cells, low end',
      value: cake?.viableCells && need !== undefined ? digits(need / cake.viableCells.low) : null,
    },
    {
      what: 'Recommended',
      value: recommended ? inBoth('smallVolume', recommended.litres, units) : null,
    },
    {
      what: 'The same by weight',
      value: recommended ? inBoth('mass', recommended.kg, units) : null,
    },
    { what: 'Rule of thumb', value: thumbText(b.volumeL, b.og, yeast.kind, units) },
    result('Kept', inBoth('smallVolume', kept.keptL, units), 'kept'),
    result(
      'Ratio',
      kept.ratio === undefined || !Number.isFinite(kept.ratio)
        ? null
        : `${digits(kept.ratio, 2)} × the need`,
      'ratio',
    ),
  ],
};

function thumbText(
  volumeL: number | undefined,
  og: number | undefined,
  kind: 'ale' | 'lager',
  units: Parameters<typeof inBoth>[2],
): string | null {
  if (volumeL === undefined || og === undefined) return null;
  const { low, high } = thumbKg({ volumeL, og, kind });
  return `${inBoth('mass', low, units)} to ${inBoth('mass', high, units)}`;
}

export const blending: ScienceSection = {
  id: 'blending',
  title: 'Gravity, colour and bitterness carried over',
  lead: 'What the beer that stays with the cake does to the new one.',
  formula: (
    <>
      <Formula
        say={`V R equals ${BEER_IN_CAKE} times the kept part, plus the beer above times kept over cake`}
      >
        <i>V</i>
        <sub>R</sub> = {BEER_IN_CAKE} × kept + above ×<Over top="kept" bottom="cake" />
      </Formula>
      <Formula say="x poured equals V B times x B plus V R times x A, over V B plus V R">
        <i>x</i> =
        <Over
          top={
            <>
              <i>V</i>
              <sub>B</sub> <i>x</i>
              <sub>B</sub> + <i>V</i>
              <sub>R</sub> <i>x</i>
              <sub>A</sub>
            </>
          }
          bottom={
            <>
              <i>V</i>
              <sub>B</sub> + <i>V</i>
              <sub>R</sub>
            </>
          }
        />
      </Formula>
      <p>
        A is the beer on the cake at its final gravity, B the new wort; x is gravity, SRM or IBU.
      </p>
    </>
  ),
  source:
    'Balance by volume. Half of a settled cake is beer: 40 to 60 % of solids are quoted by yeast makers. That differences of bitterness are noticed near 6 IBU: Mosher, Tasting Beer, 2009, at second hand; the 7.1 mg/L threshold of Kolpin and Shellhammer 2009, J. Am. Soc. Brew. Chem. 67:200–205, is of the same size.',
  interval: 'Within the 40 to 60 %, the shift itself is a fifth smaller or larger.',
  limits:
    'Volumes are taken to add up, and colours to mix by SRM. Bitterness that is held on the yeast itself is not counted; IBU also counts what is not bitter.',
  figures: ({ link: { a, b, kept, blend }, earlier, later, units }) => [
    { what: 'Kept', value: inBoth('smallVolume', kept.keptL, units) },
    {
      what: (
        <>
          <i>V</i>
          <sub>R</sub>
        </>
      ),
      value: inBoth('smallVolume', kept.retainedL, units),
    },
    {
      what: (
        <>
          <i>V</i>
          <sub>B</sub>
        </>
      ),
      value: inBoth('volume', b.volumeL, units),
    },
    { what: `Colours of ${earlier} and ${later}`, value: pair('colour', a.srm, b.srm, units) },
    {
      what: `Bitterness of ${earlier} and ${later}`,
      value: pair('bitterness', a.ibu, b.ibu, units),
    },
    { what: `Gravities that meet`, value: pair('gravity', a.fg, b.og, units) },
    result('Colour as poured', inBoth('colour', blend.srm, units), 'colour-poured'),
    result('Bitterness as poured', inBoth('bitterness', blend.ibu, units), 'bitterness-poured'),
    result('Gravity as poured', inBoth('gravity', blend.og, units), 'gravity-poured'),
  ],
};

function pair(
  kind: Parameters<typeof inBoth>[0],
  one: number | undefined,
  other: number | undefined,
  units: Parameters<typeof inBoth>[2],
): string | null {
  const [first, second] = [inBoth(kind, one, units), inBoth(kind, other, units)];
  return first === null || second === null ? null : `${first} and ${second}`;
}

export const room: ScienceSection = {
  id: 'room',
  title: 'Room in the vessel',
  lead: 'What is left for the foam over wort, cake and the beer above it.',
  formula: (
    <Formula say="Free share equals vessel minus V B minus kept minus above times kept over cake, all over V B">
      free =
      <Over
        top={
          <>
            vessel − <i>V</i>
            <sub>B</sub> − kept − above × kept ÷ cake
          </>
        }
        bottom={
          <>
            <i>V</i>
            <sub>B</sub>
          </>
        }
      />
    </Formula>
  ),
  source:
    'Arithmetic. The limits are common practice; a published plant left 25 % above its ales (Shardlow 1972, MBAA Tech. Q.).',
  interval: 'As good as the volumes.',
  limits: 'It does not know how a yeast foams. Never block the airlock of a full vessel.',
  figures: ({ link: { vessel, b, kept }, units }) => [
    { what: 'Vessel', value: inBoth('volume', vessel?.capacityL, units) },
    {
      what: (
        <>
          <i>V</i>
          <sub>B</sub>
        </>
      ),
      value: inBoth('volume', b.volumeL, units),
    },
    { what: 'Kept', value: inBoth('smallVolume', kept.keptL, units) },
    result('Free', percent(kept.freeShare), 'free'),
  ],
};

export const window: ScienceSection = {
  id: 'window',
  title: 'The temperature of the pour',
  lead: 'At which temperatures the wort may go onto the cake, and what the two make together.',
  formula: (
    <>
      <Formula say="Mixed temperature equals the sum of mass times specific heat times temperature over the sum of mass times specific heat">
        <i>T</i>
        <sub>mixed</sub> =
        <Over
          top={
            <>
              Σ <i>m c T</i>
            </>
          }
          bottom={
            <>
              Σ <i>m c</i>
            </>
          }
        />
      </Formula>
      <Formula say="Specific heat of wort equals 4.1868 minus 0.0297 P plus 0.000046 P times purity, plus 0.000075 P T">
        <i>c</i> = 4.1868 − 0.0297 <i>P</i> + 4.6·10<sup>−5</sup> <i>P</i> · 100 + 7.5·10
        <sup>−5</sup> <i>P T</i>
      </Formula>
    </>
  ),
  source:
    'Window: the yeast’s own, else 18 to 22 °C for ales and 10 to 14 °C for lagers (common practice; the maker’s range goes first). Where growth ends: Handbook of Brewing, 3rd ed., yeast chapter. Specific heat of sugar solutions: Bubník et al. 1995, from memory.',
  interval: 'Specific heats within 3 %; the mixed temperature to about 0.2 °C.',
  limits:
    'The first cells meet nearly the wort’s own temperature: the mixed one softens no verdict.',
  figures: ({ window: range, kills, mixing, units }) => [
    {
      what: range.own ? 'The yeast’s own window' : 'Usual window',
      value: temperatureRange(range.minC, range.maxC, units),
    },
    { what: 'Kills this yeast from', value: inBoth('temperature', kills.c, units) },
    { what: 'If the wort is at', value: inBoth('temperature', mixing?.wortC, units) },
    { what: 'and the cake at', value: inBoth('temperature', mixing?.cakeC, units) },
    result('Together', inBoth('temperature', mixing?.mixedC, units), 'mixed'),
  ],
};

/** A wort that nobody has read yet has no curve: an example shows how one is read. */
export const cooling: ScienceSection = {
  id: 'cooling',
  title: 'When the wort is ready',
  lead: 'A curve through the readings of the pour check tells when the wort comes into its window.',
  formula: (
    <Formula say="T of t equals S plus T zero minus S, times e to the power of minus k t">
      <i>T</i>(<i>t</i>) = <i>S</i> + (<i>T</i>
      <sub>0</sub> − <i>S</i>) e<sup>−k t</sup>
    </Formula>
  ),
  source:
    'Newton’s law of cooling, fitted by least squares; the interval is that of the likelihood ratio (Wilks 1938, Ann. Math. Stat. 9:60–62), 90 %.',
  interval: `Each reading is taken to be good to ${READING_ERROR_C} °C. Three readings leave what it cools towards free; two need the temperature of the coolant.`,
  limits:
    'Stir before reading. A chiller that is turned on or a vessel that is moved begins a new curve; the older readings are then left out.',
  figures: ({ window: range, units }) => [
    { what: 'The wort is ready at or below', value: inBoth('temperature', range.maxC, units) },
    { what: 'Readings', value: 'taken in the pour check of this link' },
  ],
};
