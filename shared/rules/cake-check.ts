import type { BoardContext } from './facts.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, NOWHERE, PASSED, type Rule } from './outcome.ts';
import { toTenth } from './rounding.ts';

/** Dead share of a cell count, 0–1 (common practice; plants are stricter). */
const DEAD_MIND = 0.1;
const DEAD_HOLD = 0.25;

type Why = 'unfit' | 'off' | 'stuck' | 'dead' | 'with-care' | 'unjudged';
interface Detail {
  why: Why;
  dead: number | undefined;
}

/** The judgement of the cake at racking. Stands nowhere off the board. */
export const cakeCheck: Rule<Detail> = {
  id: 'cake-check',

  judge({ board }) {
    const check = board?.cakeCheck;
    if (check === undefined) return NOWHERE;
    const { dead } = check;
    const held = holdsFor(check);
    if (held !== undefined) return hold({ why: held, dead });
    if ((dead ?? 0) > DEAD_MIND) return mind({ why: 'dead', dead });
    if (check.judged === 'with-care') return mind({ why: 'with-care', dead });
    return check.judged === undefined && check.dueWithinADay
      ? mind({ why: 'unjudged', dead })
      : PASSED;
  },

  describe({ standing, detail: { why, dead } }, link) {
    const { a, b } = namesOf(link);
    const { title, because } = SAID[why];
    return {
      title,
      because: because.replace('{a}', a),
      do:
        why === 'unjudged'
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
  unjudged: {
    title: 'Cake not judged',
    because: 'The pour is due within a day, and nobody has judged the cake of {a}.',
  },
};
