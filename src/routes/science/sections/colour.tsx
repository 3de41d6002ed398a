import { SRM_PER_A430 } from '#shared/units/beerSpectrum.ts';
import { GLASS_CM, type Lab } from '#shared/units/colour.ts';
import { Formula } from '../Formula.tsx';
import { digits, inBoth, result, type ScienceSection } from '../section.ts';

const labText = (lab: Lab | undefined) =>
  lab === undefined ? null : lab.map((one) => one.toFixed(1).replace('-', '−')).join(',\u00a0');

export const colour: ScienceSection = {
  id: 'colour',
  title: 'Colour of a beer',
  lead: 'What colour a beer of so many SRM has in a glass. Every beer on these pages is painted by it.',
  formula: (
    <>
      <Formula
        say={`The share of light that passes at a wavelength is ten to the power of minus S R M over ${SRM_PER_A430}, times the relative absorbance, times the path in centimetres`}
      >
        <i>T</i>(λ) = 10
        <sup>
          −(<i>SRM</i> ÷ {SRM_PER_A430}) · <i>s</i>(λ) · <i>d</i>
        </sup>
      </Formula>
      <Formula say="The relative absorbance is 0.02465 times e to the minus lambda minus 430 over 17.591, plus 0.97535 times e to the minus lambda minus 430 over 82.122">
        <i>s</i>(λ) = 0.02465 e<sup>−(λ − 430) ÷ 17.591</sup> + 0.97535 e
        <sup>−(λ − 430) ÷ 82.122</sup>
      </Formula>
      <p>
        Summed over daylight (D65) and the eye (CIE 1931, 2°) every 5 nm, then written as CIE L*, a*
        and b*. EBC is 25 ÷ {SRM_PER_A430} = 1.97 times SRM.
      </p>
    </>
  ),
  source:
    'SRM: ASBC MOA Beer-10; EBC: EBC Analytica 9.6. The mean spectrum of beer: deLange, in Bamforth (ed.), Brewing Materials and Processes, 2016, coefficients from memory. Daylight: CIE 15, from memory, its white point tested.',
  interval:
    'The mean spectrum stands for bright beers of malt; single beers part from it by a shade.',
  limits: 'Not for beers with fruit or other colours of their own, nor for hazy ones.',
  figures: ({ link: { a, b, blend }, colours, earlier, later, units }) => [
    { what: `Colour of ${earlier}`, value: inBoth('colour', a.srm, units) },
    { what: `Colour of ${later}, as planned`, value: inBoth('colour', b.srm, units) },
    {
      what: `L*, a*, b* of it in ${GLASS_CM} cm`,
      value: labText(colours?.planned),
    },
    { what: `Colour of ${later}, as poured`, value: inBoth('colour', blend.srm, units) },
    result(`L*, a*, b* of that`, labText(colours?.poured), 'lab'),
  ],
};

export const colourDifference: ScienceSection = {
  id: 'colour-difference',
  title: 'Whether anybody sees it',
  lead: 'How far apart two colours look. About 1 is seen side by side, 3 by anybody.',
  formula: (
    <>
      <Formula say="Delta E 00 is the square root of the sum of the squares of the weighted differences of lightness, chroma and hue, and of the rotation term">
        ΔE<sub>00</sub> = √
        <span className="border-t-[1.5px] border-current pt-0.5">
          (ΔL′ ÷ S<sub>L</sub>)<sup>2</sup> + (ΔC′ ÷ S<sub>C</sub>)<sup>2</sup> + (ΔH′ ÷ S
          <sub>H</sub>)<sup>2</sup> + R<sub>T</sub> (ΔC′ ÷ S<sub>C</sub>) (ΔH′ ÷ S<sub>H</sub>)
        </span>
      </Formula>
      <p>
        L′, C′ and H′ are lightness, chroma and hue; each S weighs one of them as the eye does where
        the colour lies, and R turns the blues.
      </p>
    </>
  ),
  source:
    'CIEDE2000, after the equations of Sharma, Wu and Dalal 2005, Color Res. Appl. 30:21–30; all tested pairs of their table 1 are met. That 1 is just seen is the meaning of the scale; 3 for anybody is common practice.',
  interval: 'The formula is exact; how well one looks is not.',
  limits: 'In a glass of 5 cm against daylight. A pub is darker and kinder.',
  figures: ({ colours, link, later, units }) => [
    { what: `L*, a*, b* of ${later} as planned`, value: labText(colours?.planned) },
    { what: 'L*, a*, b* as poured', value: labText(colours?.poured) },
    {
      what: 'From and to',
      value:
        link.b.srm === undefined || link.blend.srm === undefined
          ? null
          : `${inBoth('colour', link.b.srm, units)} to ${inBoth('colour', link.blend.srm, units)}`,
    },
    result(
      <>
        ΔE<sub>00</sub>
      </>,
      digits(link.colourShift, 2),
      'delta-e',
    ),
  ],
};
