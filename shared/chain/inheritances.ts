import type { Inheritance } from '../rules/facts.ts';

/** Inheritances kept once each, so that equal ones are the same object and bear one number. */
export class Inheritances {
  readonly #byContent = new Map<string, Inheritance>();
  readonly #numbers = new Map<Inheritance, number>();
  readonly #followers = new Map<Inheritance, Map<string, Inheritance>>();

  /** What follows on `before` after one beer, made once for each beer. */
  after(before: Inheritance, batchId: string, make: () => Inheritance): Inheritance {
    let known = this.#followers.get(before);
    if (!known) this.#followers.set(before, (known = new Map()));
    const done = known.get(batchId);
    if (done) return done;
    const after = this.#only(make());
    known.set(batchId, after);
    return after;
  }

  number(inheritance: Inheritance): number {
    const known = this.#numbers.get(inheritance);
    if (known !== undefined) return known;
    const number = this.#numbers.size;
    this.#numbers.set(inheritance, number);
    return number;
  }

  #only(inheritance: Inheritance): Inheritance {
    const content = contentOf(inheritance);
    const known = this.#byContent.get(content);
    if (known) return known;
    this.#byContent.set(content, inheritance);
    return inheritance;
  }
}

/** The order in which allergens and cultures came in does not matter. */
const contentOf = ({ allergens, cultures, ...rest }: Inheritance): string =>
  JSON.stringify([
    allergens.toSorted(),
    cultures.toSorted(),
    rest.strongestOg ?? null,
    rest.ogUnknown ?? false,
    rest.allergensUnknown ?? false,
    rest.culturesUnknown ?? false,
  ]);
