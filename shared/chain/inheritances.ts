import type { Inheritance } from '../rules/facts.ts';

/** Inheritances kept once each, so that equal ones bear one number. */
export class Inheritances {
  readonly #all: Inheritance[] = [];
  readonly #byContent = new Map<string, number>();
  /** By the inheritance before, then by the beer. */
  readonly #followers: number[][] = [];

  of(number: number): Inheritance {
    const known = this.#all[number];
    if (!known) throw new RangeError(`No inheritance ${number}`);
    return known;
  }

  number(inheritance: Inheritance): number {
    const content = contentOf(inheritance);
    const known = this.#byContent.get(content);
    if (known !== undefined) return known;
    const number = this.#all.push(inheritance) - 1;
    this.#byContent.set(content, number);
    this.#followers.push([]);
    return number;
  }

  /** What follows after one more beer; undefined until it was told. */
  follower(before: number, beer: number): number | undefined {
    return this.#followers[before]?.[beer];
  }

  /** Tells what follows after one more beer. */
  follow(before: number, beer: number, is: Inheritance): number {
    const followers = this.#followers[before] ?? [];
    return (followers[beer] = isSame(this.of(before), is) ? before : this.number(is));
  }
}

/** True where a beer handed nothing down that was not there; its lists are then those before. */
const isSame = (was: Inheritance, is: Inheritance): boolean =>
  was.allergens === is.allergens &&
  was.cultures === is.cultures &&
  was.strongestOg === is.strongestOg &&
  was.ogUnknown === is.ogUnknown &&
  was.allergensUnknown === is.allergensUnknown &&
  was.culturesUnknown === is.culturesUnknown;

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
