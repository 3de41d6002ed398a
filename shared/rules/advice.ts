import { points } from '../units/gravity.ts';
import type { Advice } from './answer.ts';
import { hopLoad, onCake } from './hops-in-cake.ts';
import type { LinkState } from './linkState.ts';
import { namesOf, type Names } from './names.ts';
import { SG_18_PLATO, toHundredth } from './rounding.ts';
import { atMost, days, listed, type Say } from './say.ts';
import { CULTURE_WORDS } from './words.ts';

/** What a brewer would add, which is no verdict. Each piece is told where it applies. */
type Piece = (link: LinkState, names: Names, say: Say) => string | null;

/** From this multiple of the need a kept cake foams over (common practice). */
const BIG_CAKE = 3;

const oxygen: Piece = ({ pointsB }, { b }) =>
  pointsB !== undefined && pointsB > points(1.065)
    ? `Give ${b} oxygen and yeast nutrient: a strong wort asks more of the cells. Keep oxygen from oil and flame.`
    : null;

const secondOxygen: Piece = ({ pointsB }, { b }) =>
  pointsB !== undefined && pointsB >= points(SG_18_PLATO)
    ? `Give ${b} a second dose of oxygen 12 to 18 hours after the pour.`
    : null;

const blowOff: Piece = ({ kept: { ratio = 0 } }) =>
  ratio >= BIG_CAKE && Number.isFinite(ratio)
    ? `The kept cake holds ${atMost(ratio, 1)} times the cells that are needed: use a blow-off tube of 25 mm or more.`
    : null;

const surplus: Piece = ({ kept: { keptL, share }, cake }, _names, say) =>
  keptL !== undefined && share !== undefined && share > 0 && share < 0.99 && cake !== undefined
    ? `The other ${say.part(cake.volumeL.likely - keptL)} of cake could be jarred, lid loose. ` +
      'Too much yeast does less harm than too little, but it flattens character.'
    : null;

const measureCake: Piece = ({ cake, kept: { ratio, share }, need }, { b }) => {
  if (cake?.viableCells === undefined || ratio === undefined || ratio < 1) return null;
  return need !== undefined && share !== undefined && cake.viableCells.low * share < need
    ? `At the low end of its estimate the kept cake falls short of what ${b} needs: measure or weigh the cake.`
    : null;
};

const clamped: Piece = ({ kept, cake }, _names, say) =>
  kept.clamped && cake !== undefined
    ? `More was asked for than there is: the whole cake is about ${say.part(cake.volumeL.likely)}.`
    : null;

const darkUnseen: Piece = (link, { a, b }) => {
  const { a: earlier, b: later, rules } = link;
  if (earlier.srm === undefined || later.srm === undefined) return null;
  if (toHundredth(toHundredth(earlier.srm) - toHundredth(later.srm)) < rules.darkSrm) return null;
  const shift = link.colourShift;
  return shift !== undefined && shift < rules.colourShiftMind
    ? `${a} is darker than ${b}, though nobody will see it in the glass (a difference of ${atMost(shift, 1)}).`
    : null;
};

const rackLate: Piece = ({ times: { waitDays = 0 } }) =>
  waitDays > 0
    ? `Rather than leave the cake bare for ${days(waitDays)}, rack while the wort chills, so that it is bare for less than an hour.`
    : null;

const harvestFirst: Piece = ({ a: { dryHops = [] } }, { a }) =>
  onCake(dryHops).length > 0 ? `Harvest the yeast of ${a} before its dry hops go in.` : null;

const packaged: Piece = ({ a, inherited, rules }, { b }) => {
  const risks = [
    ...(hopLoad(a.dryHops ?? [], rules.baggedShare) > 0 ? ['dry hops'] : []),
    ...inherited.cultures.map((one) => CULTURE_WORDS[one]),
  ];
  return risks.length > 0
    ? `With ${listed(risks)} in the cake ${b} may ferment further in the package, over-carbonate and burst it: package only at a steady gravity.`
    : null;
};

const wholeTwice: Piece = ({ wholeCakeBefore, pour }, { a, b }) =>
  wholeCakeBefore && pour.keepL === undefined
    ? `${a} got a whole cake too: the cake under ${b} may be larger than the estimate, which counts a usual pitch.`
    : null;

const PIECES: readonly (readonly [string, Piece])[] = [
  ['oxygen', oxygen],
  ['second-oxygen', secondOxygen],
  ['blow-off', blowOff],
  ['jar-the-rest', surplus],
  ['measure-the-cake', measureCake],
  ['kept-all-there-is', clamped],
  ['whole-cake-twice', wholeTwice],
  ['dark-but-unseen', darkUnseen],
  ['rack-while-chilling', rackLate],
  ['harvest-before-hops', harvestFirst],
  ['steady-before-packaging', packaged],
];

export function adviceFor(link: LinkState, say: Say): Advice[] {
  const names = namesOf(link);
  const given: Advice[] = [];
  for (const [id, piece] of PIECES) {
    const text = piece(link, names, say);
    if (text !== null) given.push({ id, text });
  }
  return given;
}
