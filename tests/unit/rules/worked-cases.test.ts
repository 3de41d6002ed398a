import { describe, expect, test } from 'vitest';
import { checkChain } from '#shared/chain/checkChain.ts';
import { checkLink } from '#shared/chain/checkLink.ts';
import { inherit, NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import {
  ale,
  blonde,
  check,
  checkAsDated,
  findings,
  lager,
  linkInput,
  onRackingDay,
  PALE_LAGER,
  paleAle,
  type Case,
} from '../../support/links.ts';

/**
 * Links that a brewer would judge at sight; common practice, worked by hand and not by this code.
 * 23 L in a 32 L vessel, whole cake, brewed on the racking day; nothing else may be found.
 */
const hopped = (contained: 'loose' | 'bagged') => ({
  ...paleAle(),
  dryHops: [{ gramsPerLitre: 2, contained, timing: 'on-cake' } as const],
});
const doubleIpa = () => ({
  ...ale('dipa', 1.076, 8, 72),
  dryHops: [{ gramsPerLitre: 8, contained: 'loose', timing: 'on-cake' } as const],
});
const strong = () => ale('imperial', 1.095, 42, 60);

const cases: [string, Case, string[]][] = [
  ['blonde under a pale ale', { a: blonde(), b: paleAle() }, []],
  [
    'pale lager under a Baltic porter',
    { a: lager('pils', 1.046, 3, 22), b: lager('baltic', 1.088, 26, 34), yeast: PALE_LAGER },
    [],
  ],
  ['stout under an imperial stout', { a: ale('stout', 1.054, 33, 32), b: strong() }, []],
  ['loose hops under a double IPA', { a: hopped('loose'), b: doubleIpa() }, ['mind hops-in-cake']],
  ['bagged hops under a double IPA', { a: hopped('bagged'), b: doubleIpa() }, []],
  [
    'loose hops under a dry stout without any',
    { a: hopped('loose'), b: ale('dry', 1.036, 34, 38) },
    ['hold hops-in-cake', 'mind strong-before-weak'],
  ],
  [
    'imperial stout under a blonde',
    { a: strong(), b: blonde() },
    ['hold light-to-dark', 'hold mild-to-bitter', 'hold strong-before-weak', 'hold tired-cake'],
  ],
  [
    'lager cake under an ale-warm pale ale',
    { a: lager('pils', 1.046, 3, 22), b: paleAle(), yeast: PALE_LAGER },
    ['hold fermentation-temperature'],
  ],
  [
    'milk stout under an oatmeal stout',
    {
      a: {
        ...ale('milk', 1.056, 36, 30),
        additions: [{ what: 'lactose', timing: 'on-cake' }],
        allergens: ['milk'],
      },
      b: ale('oat', 1.058, 36, 32),
    },
    ['hold allergen', 'mind flavour-left'],
  ],
  [
    'soured wheat beer under a blonde',
    { a: { ...ale('sour', 1.032, 3, 5), cultures: ['bacteria'] }, b: blonde() },
    ['hold wild-culture'],
  ],
  [
    'a tight vessel',
    { a: blonde(), b: paleAle(), rest: { vessel: { capacityL: 24, blowOff: false } } },
    ['hold headspace'],
  ],
];

describe('worked links', () => {
  test.each(cases)('%s', (_name, of, expected) => {
    const answer = check(of);
    expect(findings(answer)).toEqual(expected);
    expect(answer.unchecked).toEqual([]);
    const worst = expected.some((one) => one.startsWith('hold'));
    expect(answer.verdict).toBe(worst ? 'hold' : expected.length > 0 ? 'mind' : 'pour');
  });

  test('an imperial stout is poured with advice on oxygen', () => {
    const { advice } = check({ a: ale('stout', 1.054, 33, 32), b: strong() });
    expect(advice.map((one) => one.id)).toContain('oxygen');
  });

  test('an allergen travels past a beer that declares it', () => {
    const brown = { ...ale('nut', 1.05, 20, 25), allergens: ['tree-nuts' as const] };
    const porter = { ...ale('porter', 1.052, 25, 28), allergens: ['tree-nuts' as const] };
    const plain = ale('brown', 1.052, 25, 28);
    const first = inherit(NOTHING_INHERITED, brown);
    expect(findings(check({ a: brown, b: porter }))).toEqual([]);
    const second = check({ a: porter, b: plain, rest: { inherited: inherit(first, porter) } });
    expect(findings(second)).toEqual(['hold allergen']);
    // Even where the porter's own row says nothing of it.
    const silent = check({ a: { ...porter, allergens: [] }, b: plain, rest: { inherited: first } });
    expect(findings(silent)).toEqual(['hold allergen']);
  });

  test('brewed two days before racking is a hold, unless the yeast came from the cone', () => {
    const early = { ...paleAle(), brewOn: '2027-03-18' };
    expect(findings(checkAsDated({ a: blonde(), b: early }))).toEqual(['hold brew-day']);
    const cone = { takenOn: '2027-03-16' };
    const cropped = checkAsDated({ a: blonde(), b: early, pour: cone });
    expect(cropped.waitDays).toBe(2);
    expect(findings(cropped)).toEqual([]);
    expect(cropped.unchecked).toEqual([]);
  });

  test('two days after racking at 20 °C is a mind', () => {
    const late = { ...paleAle(), brewOn: '2027-03-22' };
    expect(findings(checkAsDated({ a: blonde(), b: late }))).toEqual(['mind cake-wait']);
  });

  test('the eighth batch of a chain of equal ales is a mind', () => {
    const equal = ale('equal', 1.04, 6, 25);
    const link = linkInput({ a: equal, b: onRackingDay(equal, equal), rest: { generation: 8 } });
    expect(findings(checkLink(link))).toEqual(['mind generation']);
    const batches = Array.from({ length: 8 }, (_, i) => ({
      id: `${i}`,
      volumeL: 23,
      og: 1.04,
      fg: 1.01,
      srm: 6,
      ibu: 25,
      fermentC: 20,
      daysUnderBeer: 14,
      brewOn: `2027-0${1 + Math.floor(i / 2)}-${i % 2 === 0 ? '01' : '15'}`,
      dryHop: null,
      additions: [],
      allergens: [],
      cultures: [],
    }));
    const answer = checkChain({
      yeast: { kind: 'ale', character: false, fermentMinC: 18, fermentMaxC: 22 },
      vessel: { capacityL: 32, blowOff: false },
      firstGeneration: 1,
      batches,
    });
    const generations = answer.links.map(({ findings: found }) =>
      found.some((one) => one.rule === 'generation'),
    );
    expect(generations).toEqual([false, false, false, false, false, false, true]);
  });
});
