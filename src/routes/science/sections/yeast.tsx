import {
  CAKE_KG_PER_L,
  CELLS_PER_ML_CAKE,
  GROWTH_SPREAD,
  SETTLED,
  VIABILITY,
} from '#shared/cake/estimate.ts';
import { YIELD_PER_ML_PLATO } from '#shared/yeast/growth.ts';
import { CELLS_PER_ML_PLATO, STRONG_SHARE } from '#shared/yeast/pitching.ts';
import { LN_RATE_AT_0C, LN_RATE_PER_C } from '#shared/yeast/storage.ts';
import { cellsSpan, cellsText } from '../../chain/courseWords.ts';
import { Formula, Over } from '../Formula.tsx';
import {
  digits,
  inBoth,
  signed,
  millions,
  percent,
  plato,
  result,
  type ScienceSection,
} from '../section.ts';

const cells = (value: number | undefined) => (value === undefined ? null : cellsText(value));

export const growth: ScienceSection = {
  id: 'growth',
  title: 'Cells in a cake',
  lead: 'What was pitched and what grew of it; most of it settles. A cake that was weighed, measured or counted replaces what it measures.',
  formula: (
    <>
      <Formula
        say={`Cells settled are ${SETTLED} times, cells pitched plus ${YIELD_PER_ML_PLATO / 1e6} million times the taper, times O E minus A E, times the volume in millilitres`}
      >
        <i>N</i> = {SETTLED} × (<i>N</i>
        <sub>0</sub> + {YIELD_PER_ML_PLATO / 1e6}·10<sup>6</sup> × <i>g</i> × (<i>OE</i> − <i>AE</i>
        ) × <i>V</i>)
      </Formula>
      <Formula say={`Living cells are ${VIABILITY} times N times the share that survives the wait`}>
        living = {VIABILITY} × <i>N</i> × <i>S</i>
      </Formula>
      <Formula
        say={`Litres of cake are N over ${CELLS_PER_ML_CAKE / 1e9} billion per millilitre times 1 minus the share of trub`}
      >
        cake =
        <Over
          top={<i>N</i>}
          bottom={
            <>
              {CELLS_PER_ML_CAKE / 1e9}·10<sup>9</sup> per mL × (1 − trub)
            </>
          }
        />
        , at {CAKE_KG_PER_L} kg/L
      </Formula>
      <p>
        N₀ is what the earlier beer needed at its rate, whatever was really pitched. g is 1 up to 16
        °P, 0.85 at 18, 0.70 at 22, 0.60 from 25.
      </p>
    </>
  ),
  source:
    'Growth between White and Zainasheff, Yeast, 2010 (7.4 million per mL and °P, citing Nielsen 2005) and the peak of 80 million per mL in Boulton and Quain, Brewing Yeast and Fermentation, 2001. Smaller crops of strong worts: Suihko, Vilpola and Linko 1993, J. Inst. Brew. 99; the numbers of g are our judgement. Cells in a mL of slurry: yeast makers, at second hand; trub is common practice.',
  interval: `Growth is uncertain by a factor of ${GROWTH_SPREAD} either way, nine times in ten.`,
  limits:
    'Aerated starters grow more, some strains two or three times as much. Trub and density are rough: measure the cake where it matters.',
  figures: ({ growth: worked, link, earlier, units }) => [
    {
      what: (
        <>
          <i>N</i>
          <sub>0</sub>, the need of {earlier}
        </>
      ),
      value: cells(worked?.pitched),
    },
    {
      what: (
        <>
          <i>OE</i> − <i>AE</i>
        </>
      ),
      value: plato(worked?.drop),
    },
    { what: <i>g</i>, value: digits(worked?.share) },
    {
      what: (
        <>
          <i>V</i>
        </>
      ),
      value: inBoth('volume', link.a.volumeL, units),
    },
    { what: 'Grown', value: cells(worked?.grown) },
    { what: 'Share of trub', value: percent(worked?.trub) },
    result(
      'Cake',
      link.cake ? inBoth('smallVolume', link.cake.volumeL.likely, units) : null,
      'cake',
    ),
    result(
      `Living cells${link.cake?.measured ? ', as measured' : ''}`,
      link.cake?.viableCells
        ? `${cellsText(link.cake.viableCells.likely)} (${cellsSpan(link.cake.viableCells)})`
        : null,
      'living',
    ),
  ],
};

export const survival: ScienceSection = {
  id: 'survival',
  title: 'What survives the wait',
  lead: 'A bare or cropped cake loses cells every day, faster when it is warm.',
  formula: (
    <>
      <Formula say="S equals e to the power of minus k times days">
        <i>S</i> = e<sup>−k · days</sup>
      </Formula>
      <Formula
        say={`The natural logarithm of k equals ${LN_RATE_AT_0C} plus ${LN_RATE_PER_C} times the temperature in degrees Celsius`}
      >
        ln <i>k</i> = {signed(LN_RATE_AT_0C)} + {LN_RATE_PER_C} <i>T</i>
      </Formula>
    </>
  ),
  source:
    'Fitted to the four losses of McCaig and Bendiak 1985, MBAA Tech. Q. 22(4): lager slurry of one brewery at 1, 5 and (our reading) 25 °C. Three days at 1.6 °C in Sall et al. 1988, quoted in Boulton and Quain 2001, are met.',
  interval:
    'The half-life may be 2.5 times shorter to 10 times longer in the cold, half to three times when warm.',
  limits:
    'Nothing beyond a week is data, and no published curve was found for a cake under beer at cellar temperature. Stirred slurry dies faster.',
  figures: ({ wait, link: { times }, units }) => [
    {
      what: 'Days',
      value: times.waitDays === undefined ? null : digits(Math.max(0, times.waitDays)),
    },
    {
      what: (
        <>
          <i>T</i>
        </>
      ),
      value: inBoth('temperature', times.waitC, units),
    },
    {
      what: <i>k</i>,
      value: wait ? `${digits(wait.rate)} a day` : 'not asked: the cake does not wait',
    },
    ...(wait
      ? [
          {
            what: 'It may lie between',
            value: `${percent(wait.range.low)} and ${percent(wait.range.high)}`,
          },
        ]
      : []),
    result(<i>S</i>, percent(times.survival), 'survival'),
  ],
};

export const need: ScienceSection = {
  id: 'need',
  title: 'What a wort needs',
  lead: 'How many living cells the new wort asks for.',
  formula: (
    <>
      <Formula say="Need equals the rate, times P, times the volume in millilitres">
        need = <i>r</i> × <i>P</i> × <i>V</i>
      </Formula>
      <p>
        r is {CELLS_PER_ML_PLATO.ale / 1e6} million living cells per mL and °P for ales,{' '}
        {CELLS_PER_ML_PLATO.lager / 1e6} for lagers, and {STRONG_SHARE} times as many from 18 °P.
      </p>
    </>
  ),
  source:
    'Fix, Analysis of Brewing Techniques, 1997, as quoted in the trade. The step at 18 °P: 2.3 to 2.9 million in Suihko, Vilpola and Linko 1993, J. Inst. Brew. 99.',
  interval: 'Yeast makers publish 0.75 to 1.5 million per mL and °P by strain.',
  limits:
    'A rate for healthy yeast and aerated wort; some farmhouse yeasts are pitched at a tenth of it.',
  figures: ({ need: worked, link, later, units }) => [
    { what: <i>r</i>, value: millions(worked?.perMlPlato) },
    {
      what: (
        <>
          <i>P</i> of {later}
        </>
      ),
      value: plato(worked?.plato),
    },
    { what: <i>V</i>, value: inBoth('volume', link.b.volumeL, units) },
    result('Need', cells(link.need), 'need'),
  ],
};
