import type { CheckChainAnswer, CheckChainRequest } from '../api/check.ts';
import type { UnitPrefs } from '../api/units.ts';
import type { LinkAnswer } from '../rules/answer.ts';
import type { BatchFacts, Inheritance } from '../rules/facts.ts';
import { rackDay } from '../rules/linkTimes.ts';
import { resolveHouseRules, type HouseRules } from '../rules/resolve.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import { checkLink } from './checkLink.ts';
import { inherit, NOTHING_INHERITED } from './inherit.ts';
import { batchFrom, linkToWire, pourFrom, vesselFrom, yeastFrom } from './wire.ts';

/**
 * Judges a chain that stands nowhere but in the request: every link, racking days, generations. The
 * request is one that `checkChainRequest` let through; house rules that it would refuse throw a
 * RangeError. Sentences are written in the given units; figures are litres, SG, SRM, IBU, °C, days.
 */
export function checkChain(request: CheckChainRequest, units?: UnitPrefs): CheckChainAnswer {
  const batches = request.batches.map(batchFrom);
  const first = request.firstGeneration ?? null;
  const generations = batches.map((_, i) => (first === null ? null : first + i));
  const links = checkLinks(request, batches, generations, units);
  const counts = { pour: 0, mind: 0, hold: 0 };
  for (const link of links) counts[link.verdict] += 1;
  return {
    verdict: worst(counts),
    chain: { counts, rackOn: batches.map((one) => rackDay(one) ?? null), generations },
    links: links.map(linkToWire),
  };
}

function checkLinks(
  request: CheckChainRequest,
  batches: readonly BatchFacts[],
  generations: readonly (number | null)[],
  units: UnitPrefs | undefined,
): LinkAnswer[] {
  const rules = rulesOf(request);
  const yeast = yeastFrom(request.yeast);
  const vessel = vesselFrom(request.vessel);
  const links: LinkAnswer[] = [];
  let inherited = startOf(request);
  let wholeCakeBefore = false;
  request.batches.forEach((asked, i) => {
    const earlier = batches[i - 1];
    const later = batches[i];
    if (earlier === undefined || later === undefined) return;
    inherited = inherit(inherited, earlier);
    const pour = pourFrom(asked);
    const generation = generations[i] ?? undefined;
    links.push(
      checkLink({
        earlier,
        later,
        pour,
        yeast,
        vessel,
        generation,
        inherited,
        rules,
        units,
        wholeCakeBefore,
      }),
    );
    wholeCakeBefore = pour.keepL === undefined;
  });
  return links;
}

function rulesOf({ houseRules }: CheckChainRequest): HouseRules {
  const resolved = resolveHouseRules(houseRules ?? {});
  if (!resolved.ok)
    throw new RangeError(resolved.issues.map(({ key, detail }) => `${key}: ${detail}`).join('; '));
  return resolved.rules;
}

const startOf = ({ strongestEarlierOg }: CheckChainRequest): Inheritance =>
  typeof strongestEarlierOg === 'number'
    ? { ...NOTHING_INHERITED, strongestOg: strongestEarlierOg }
    : NOTHING_INHERITED;

const worst = ({ mind, hold }: Record<Verdict, number>): Verdict =>
  hold > 0 ? 'hold' : mind > 0 ? 'mind' : 'pour';
