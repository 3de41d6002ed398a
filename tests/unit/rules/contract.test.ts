import { describe, expect, test } from 'vitest';
import { checkChainAnswer, checkChainRequest } from '#shared/api/check.ts';
import { checkChain } from '#shared/chain/checkChain.ts';
import { RULE_IDS } from '#shared/rules/vocabulary.ts';

const first = () => ({
  id: 'a',
  name: 'Blonde',
  volumeL: 23,
  og: 1.044,
  fg: 1.011,
  srm: 4,
  ibu: 20,
  fermentC: 20,
  daysUnderBeer: 14,
  brewOn: '2027-03-06',
  dryHop: null,
  additions: [],
  allergens: [],
  cultures: [],
  trub: 'some',
});
const second = () => ({
  ...first(),
  id: 'b',
  name: 'Pale',
  og: 1.052,
  fg: 1.013,
  srm: 7,
  ibu: 38,
  brewOn: '2027-03-20',
  dryHop: { gramsPerLitre: 2, contained: 'loose', timing: 'on-cake' },
  additions: [{ what: 'coffee', timing: 'after-taking' }],
  allergens: ['gluten'],
  vessel: null,
  otherYeast: null,
  takenOn: null,
  keepL: null,
  leftAboveL: null,
  cakeC: null,
  starter: false,
  beersSinceCleaning: null,
});
const request = () => ({
  yeast: {
    kind: 'ale',
    character: false,
    fermentMinC: 18,
    fermentMaxC: 22,
    pourMinC: 18,
    pourMaxC: 22,
    neverAboveC: null,
    generationLimit: 7,
  },
  vessel: { capacityL: 32, blowOff: false },
  firstGeneration: 1,
  strongestEarlierOg: null,
  houseRules: {},
  batches: [first(), second()],
});

const answered = (body: unknown) => checkChain(checkChainRequest.parse(body));
/** Paths of every issue, sorted. */
const refused = (body: unknown): string[] =>
  (checkChainRequest.safeParse(body).error?.issues ?? [])
    .flatMap((issue) =>
      issue.code === 'unrecognized_keys'
        ? issue.keys.map((key) => [...issue.path, key].join('.'))
        : [issue.path.join('.')],
    )
    .sort();

describe('a chain that is sent whole', () => {
  test('two batches make one link', () => {
    const answer = answered(request());
    expect(checkChainAnswer.safeParse(answer).success).toBe(true);
    expect(answer).toMatchObject({
      verdict: 'pour',
      chain: {
        counts: { pour: 1, mind: 0, hold: 0 },
        rackOn: ['2027-03-20', '2027-04-03'],
        generations: [1, 2],
      },
    });
    expect(answer.links[0]).toMatchObject({
      from: 'a',
      to: 'b',
      verdict: 'pour',
      generation: 2,
      takenOn: '2027-03-20',
      waitDays: 0,
      findings: [],
      unchecked: [],
    });
    expect(answer.links[0]?.advice.map((one) => one.id)).toEqual(['blow-off']);
    const elsewhere = ['cake-check', 'unwashed-vessel'];
    expect([...(answer.links[0]?.passed ?? [])].sort()).toEqual(
      RULE_IDS.filter((rule) => !elsewhere.includes(rule)).sort(),
    );
  });

  test('one batch has no links and pours', () => {
    const alone = answered({ ...request(), batches: [first()] });
    expect(alone).toEqual({
      verdict: 'pour',
      chain: {
        counts: { pour: 0, mind: 0, hold: 0 },
        rackOn: ['2027-03-20'],
        generations: [1],
      },
      links: [],
    });
  });

  test('of a batch of which nothing is known only the known rules stand', () => {
    const answer = answered({ yeast: { kind: 'ale' }, batches: [{ id: 'a' }, { id: 'b' }] });
    expect(answer.chain).toMatchObject({ rackOn: [null, null], generations: [null, null] });
    const link = answer.links[0];
    expect(link?.passed).toEqual(['same-yeast']);
    expect(link?.unchecked).toHaveLength(RULE_IDS.length - 3);
    for (const { missing } of link?.unchecked ?? []) expect(missing.length).toBeGreaterThan(0);
    expect(link?.blend).toEqual({ og: null, srm: null, ibu: null, deltaE00: null });
    expect(link?.keep.keptL).toBeNull();
  });

  test('dry hops: null is none, a list adds up, absent is unknown', () => {
    const with_ = (dryHop: unknown) =>
      answered({ ...request(), batches: [{ ...first(), dryHop }, second()] }).links[0];
    const half = { gramsPerLitre: 0.4, contained: 'loose', timing: 'on-cake' };
    expect(with_(null)?.passed).toContain('hops-in-cake');
    expect(with_([])?.passed).toContain('hops-in-cake');
    expect(with_(half)?.passed).toContain('hops-in-cake');
    expect(with_([half, half])?.findings.map((one) => one.rule)).toEqual(['hops-in-cake']);
    expect(with_(undefined)?.unchecked).toEqual([{ rule: 'hops-in-cake', missing: ['dryHop'] }]);
  });

  test('house rules and earlier strong beers count', () => {
    const strict = answered({ ...request(), houseRules: { fallMind: 0, jumpMind: 5 } });
    expect(strict.links[0]?.findings.map((one) => one.rule)).toEqual(['gravity-jump']);
    const later = answered({ ...request(), firstGeneration: 4, strongestEarlierOg: 1.074 });
    expect(later.links[0]?.findings.map((one) => one.rule)).toEqual(['generation']);
    expect(answered({ ...request(), firstGeneration: 7 }).verdict).toBe('mind');
  });
});

describe('what is refused', () => {
  const second_ = (change: object) => ({
    ...request(),
    batches: [first(), { ...second(), ...change }],
  });
  const first_ = (change: object) => ({
    ...request(),
    batches: [{ ...first(), ...change }, second()],
  });

  test.each([
    [{ og: 0.999 }, ['batches.1.fg', 'batches.1.og']],
    [{ og: 1.201 }, ['batches.1.og']],
    [{ fg: 0.984 }, ['batches.1.fg']],
    [{ fg: 1.053 }, ['batches.1.fg']],
    [{ srm: 100.1 }, ['batches.1.srm']],
    [{ ibu: 201 }, ['batches.1.ibu']],
    [{ volumeL: 0.4 }, ['batches.1.volumeL']],
    [{ volumeL: 5001 }, ['batches.1.volumeL']],
    [{ daysUnderBeer: 0 }, ['batches.1.daysUnderBeer']],
    [{ daysUnderBeer: 401 }, ['batches.1.daysUnderBeer']],
    [{ fermentC: 111 }, ['batches.1.fermentC']],
    [{ cakeC: -6 }, ['batches.1.cakeC']],
    [{ keepL: -1 }, ['batches.1.keepL']],
    [{ brewOn: '2027-02-30' }, ['batches.1.brewOn']],
    [{ cultures: ['yoghurt'] }, ['batches.1.cultures.0']],
    [{ colour: 3, strength: 4 }, ['batches.1.colour', 'batches.1.strength']],
    [{ og: '1.052', ibu: 'some', more: 1 }, ['batches.1.ibu', 'batches.1.more', 'batches.1.og']],
    [{ id: 'a' }, ['batches']],
    [
      { dryHop: { gramsPerLitre: 51, contained: 'loose', timing: 'on-cake' } },
      ['batches.1.dryHop.gramsPerLitre'],
    ],
  ])('a later batch with %o', (change, paths) => expect(refused(second_(change))).toEqual(paths));

  test.each([
    { takenOn: '2027-03-16' },
    { keepL: 1 },
    { leftAboveL: 0 },
    { cakeC: 4 },
    { starter: false },
    { otherYeast: { kind: 'ale', character: false } },
    { beersSinceCleaning: 1 },
  ])('a first batch with %o', (change) => {
    expect(refused(first_(change))).toEqual([`batches.0.${Object.keys(change).join('')}`]);
    expect(refused(second_(change))).toEqual([]);
  });

  test('half a range, and a range upside down', () => {
    const yeast = (change: object) => ({ ...request(), yeast: { ...request().yeast, ...change } });
    expect(refused(yeast({ fermentMinC: null }))).toEqual(['yeast.fermentMinC']);
    expect(refused(yeast({ pourMaxC: undefined }))).toEqual(['yeast.pourMaxC']);
    expect(refused(yeast({ pourMinC: 23 }))).toEqual(['yeast.pourMaxC']);
    expect(refused(yeast({ pourMinC: null, pourMaxC: null }))).toEqual([]);
  });

  test('every issue comes at once, house rules and the first batch with them', () => {
    const body = {
      ...first_({ keepL: 1, fg: 1.1, srm: -1 }),
      houseRules: { darkSrm: 99, hopsMind: 4, softened: ['allergen'], shade: 1 },
      colour: 'dark',
    };
    expect(refused(body)).toEqual([
      'batches.0.fg',
      'batches.0.keepL',
      'batches.0.srm',
      'colour',
      'houseRules.darkSrm',
      'houseRules.hopsMind',
      'houseRules.shade',
      'houseRules.softened',
    ]);
  });

  test.each([null, [], 3, 'chain', {}, { batches: null }, { yeast: null, batches: [null] }])(
    '%o',
    (body) => expect(refused(body).length).toBeGreaterThan(0),
  );
  test('no batch', () => expect(refused({ ...request(), batches: [] })).toEqual(['batches']));
});
