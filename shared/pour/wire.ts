import type { CheckPourAnswer, CheckPourRequest } from '../api/checkPour.ts';
import { DEFAULT_HOUSE_RULES, resolveHouseRules } from '../rules/resolve.ts';
import { checkPour, type PourAnswer, type PourCheck } from './check.ts';

const known = <T>(value: T | null | undefined): T | undefined => value ?? undefined;

/** What came over the wire, as the check takes it: a null is unknown, a moment a number. */
function fromWire(request: CheckPourRequest): PourCheck {
  const { yeast, wort, cake } = request;
  const resolved = resolveHouseRules(request.houseRules ?? {});
  return {
    yeast: {
      kind: yeast.kind,
      ...(typeof yeast.pourMinC === 'number' && { pourMinC: yeast.pourMinC }),
      ...(typeof yeast.pourMaxC === 'number' && { pourMaxC: yeast.pourMaxC }),
      ...(typeof yeast.neverAboveC === 'number' && { neverAboveC: yeast.neverAboveC }),
    },
    at: Date.parse(request.at),
    readings: request.readings.map(({ at, c }) => ({ at: Date.parse(at), c })),
    wort:
      typeof wort?.volumeL === 'number' && typeof wort.og === 'number'
        ? { volumeL: wort.volumeL, og: wort.og }
        : undefined,
    cake: cake ? { volumeL: known(cake.volumeL), c: known(cake.c) } : undefined,
    coolantC: known(request.coolantC),
    rules: resolved.ok ? resolved.rules : DEFAULT_HOUSE_RULES,
  };
}

const iso = (at: number): string => new Date(at).toISOString();

export function toWire(answer: PourAnswer): CheckPourAnswer {
  const { ready, window } = answer;
  return {
    verdict: answer.verdict,
    findings: answer.findings,
    window: { minC: window.minC, maxC: window.maxC },
    readingC: answer.readingC,
    mixedC: answer.mixedC,
    overridable: answer.overridable,
    ready: ready && {
      at: iso(ready.at),
      earliest: iso(ready.earliest),
      latest: iso(ready.latest),
    },
    whyNotReady: answer.whyNot,
  };
}

/** The answer to `POST /api/check/pour`. */
export const checkPourRequested = (request: CheckPourRequest): CheckPourAnswer =>
  toWire(checkPour(fromWire(request)));
