import { points } from '../units/gravity.ts';
import { abv } from '../units/alcohol.ts';
import { pitchNeed } from '../yeast/pitching.ts';
import { inherit } from '../chain/inherit.ts';
import { colourShift } from './colourShift.ts';
import { keptCake, type KeptCake } from './keptCake.ts';
import { linkCake, recommendedFor, type LinkCake } from './linkCake.ts';
import { linkTimes, type LinkTimes } from './linkTimes.ts';
import { linkBlend, type LinkBlend } from './linkBlend.ts';
import type { BatchFacts, Inheritance, PourFacts, VesselFacts, YeastFacts } from './facts.ts';
import type { LinkInput } from './linkInput.ts';
import type { HouseRules } from './resolve.ts';
import { withoutNoise } from './rounding.ts';

/**
 * One link with the figures that its rules share, each worked out once. `undefined` is unknown
 * everywhere. Units: litres, SG, SRM, IBU, °C, days, cells.
 */
export class LinkState {
  readonly a: BatchFacts;
  readonly b: BatchFacts;
  readonly pour: PourFacts;
  readonly yeast: YeastFacts;
  readonly vessel: VesselFacts | undefined;
  readonly generation: number | undefined;
  readonly rules: HouseRules;
  readonly board: LinkInput['board'];
  readonly wholeCakeBefore: boolean;
  /** A's and B's original gravity in points. */
  readonly pointsA: number | undefined;
  readonly pointsB: number | undefined;
  /** Alcohol of A, % by volume. */
  readonly abvA: number | undefined;
  readonly times: LinkTimes;
  /** A's cake; undefined where its size is unknown. */
  readonly cake: LinkCake | undefined;
  /** Viable cells that B asks for. */
  readonly need: number | undefined;
  readonly kept: KeptCake;
  readonly blend: LinkBlend;
  readonly #before: Inheritance;
  #inherited: Inheritance | undefined;
  #shift: number | undefined | null = null;
  #recommended: { litres: number; kg: number } | undefined | null = null;

  constructor(input: LinkInput) {
    const { earlier: a, later: b, pour, yeast, rules } = input;
    this.a = a;
    this.b = b;
    this.pour = pour;
    this.yeast = yeast;
    this.vessel = pour.vessel ?? input.vessel;
    this.generation = input.generation;
    this.#before = input.inherited;
    this.rules = rules;
    this.board = input.board;
    this.wholeCakeBefore = input.wholeCakeBefore ?? false;
    this.pointsA = a.og === undefined ? undefined : points(a.og);
    this.pointsB = b.og === undefined ? undefined : points(b.og);
    this.abvA =
      a.og === undefined || a.fg === undefined ? undefined : withoutNoise(abv(a.og, a.fg));
    this.times = linkTimes(a, b, pour);
    this.cake = linkCake(a, yeast.kind, this.times.survival);
    this.need =
      b.volumeL === undefined || b.og === undefined
        ? undefined
        : pitchNeed({ volumeL: b.volumeL, og: b.og, kind: yeast.kind });
    this.kept = this.keeping(pour.keepL);
    this.blend = linkBlend(a, b, this.kept.retainedL);
  }

  /** What reaches B from A and all before it; worked out when first asked. */
  get inherited(): Inheritance {
    return (this.#inherited ??= inherit(this.#before, this.a));
  }

  /** Shift of B's colour in the glass by the retained beer, ΔE00; worked out when first asked. */
  get colourShift(): number | undefined {
    if (this.#shift === null) this.#shift = this.shiftTo(this.blend.srm);
    return this.#shift;
  }

  /** ΔE00 between B as planned and B at another colour, SRM. */
  shiftTo(srm: number | undefined): number | undefined {
    return colourShift(this.b.srm, srm);
  }

  /**
   * The part to keep whose low-end estimate meets the need, at most what other worts leave of the
   * cake; undefined where unknown.
   */
  get recommended(): { litres: number; kg: number } | undefined {
    if (this.#recommended === null)
      this.#recommended = recommendedFor(this.cake, this.need, this.pour);
    return this.#recommended;
  }

  /** The figures of keeping a part, with the cake, the wort and the vessel as they are. */
  keeping(keepL: PourFacts['keepL']): KeptCake {
    return keptCake(
      this,
      keepL === 'recommended' ? (this.recommended?.litres ?? 'unknown') : keepL,
    );
  }
}

/** The part of a link that the rules on the vessel's days read. */
export type VesselDays = Pick<LinkState, 'a' | 'b' | 'pour' | 'times' | 'rules' | 'board'>;

/** The part of a link that the rules on descent read: all that a longer line of beers changes. */
export type Lineage = Pick<LinkState, 'b' | 'yeast' | 'rules' | 'generation' | 'inherited'>;
