import type { BoardContext } from './facts.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, NOWHERE, PASSED, type Rule } from './outcome.ts';
import { toTenth } from './rounding.ts';

/** Dead share of a cell count, 0–1 (common practice; plants are stricter). */
const DEAD_MIND = 0.1;
const DEAD_HOLD = 0.25;

type Why = 'unfit' | 'off' | 'stuck' | 'dead' | 'with-care' | 'noticed' | 'unjudged';
interface Detail {
  why: Why;
  dead: number | undefined;
  noticed: readonly string[];
}

/** The judgement of the cake at racking. Stands nowhere off the board. */
export const cakeCheck: Rule<Detail> = {
  id: 'cake-check',

  judge({ board }) {
    const check = board?.cakeCheck;
    if (check === undefined) return NOWHERE;
    const { dead, noticed = [] } = check;
    const because = (why: Why): Detail => ({ why, dead, noticed });
    const held = holdsFor(check);
    if (held !== undefined) return hold(because(held));
    const why = mindsFor(check);
    return why === undefined ? PASSED : mind(because(why));
  },

  describe({ standing, detail: { why, dead, noticed } }, link) {
    const { a, b } = namesOf(link);
    const { title, because } = SAID[why];
    return {
      title,
      because: [because.replace('{a}', a), ...noticed].join(' '),
      do:
        why === 'unjudged' || why === 'noticed'
          ? `Judge the cake of ${a} before ${b} is poured.`
          : `Give ${b} fresh yeast, or judge another part of the cake.`,
      measures:
        dead === undefined
          ? []
          : [
              measure(
                'Dead cells',
                toTenth(dead * 100),
                '%',
                100 * (standing === 'hold' ? DEAD_HOLD : DEAD_MIND),
              ),
            ],
      basis:
        'Common practice; plants aim below 2 % dead and exclude from 5 % (MEBAK M-350.18.518).',
    };
  },
};

function holdsFor(check: NonNullable<BoardContext['cakeCheck']>): Why | undefined {
  if (check.judged === 'unfit') return 'unfit';
  if (check.tastedOff) return 'off';
  if (check.fermentationStuck) return 'stuck';
  return (check.dead ?? 0) > DEAD_HOLD ? 'dead' : undefined;
}

/** A brewer who judged the cake knew of the readings; until then they speak for themselves. */
function mindsFor(check: NonNullable<BoardContext['cakeCheck']>): Why | undefined {
  if ((check.dead ?? 0) > DEAD_MIND) return 'dead';
  if (check.judged === 'with-care') return 'with-care';
  if (check.judged !== undefined) return undefined;
  if ((check.noticed ?? []).length > 0) return 'noticed';
  return check.dueWithinADay ? 'unjudged' : undefined;
}

const SAID: Record<Why, { title: string; because: string }> = {
  unfit: { title: 'Cake judged unfit', because: 'The cake of {a} was judged unfit.' },
  off: { title: 'Beer tastes off', because: 'The beer above the cake of {a} tasted off.' },
  stuck: { title: 'Stuck fermentation', because: 'The fermentation of {a} got stuck.' },
  dead: {
    title: 'Many dead cells',
    because: 'A cell count found many dead cells in the cake of {a}.',
  },
  'with-care': {
    title: 'Cake wants care',
    because: 'The cake of {a} was judged to be used with care.',
  },
  noticed: {
    title: 'Readings give warning',
    because: 'The fermentation of {a} was not as it should be.',
  },
  unjudged: {
    title: 'Cake not judged',
    because: 'The pour is due within a day, and nobody has judged the cake of {a}.',
  },
};
