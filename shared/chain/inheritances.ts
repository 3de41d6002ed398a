import type { Inheritance } from '../rules/facts.ts';
import { ALLERGENS, CULTURES } from '../rules/vocabulary.ts';

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

/** The order in which allergens and cultures came in does not matter: a bit stands for each. */
function contentOf(inheritance: Inheritance): string {
  const { allergens, cultures, strongestOg, ogUnknown, allergensUnknown, culturesUnknown } =
    inheritance;
  const unknown = (ogUnknown ? 1 : 0) + (allergensUnknown ? 2 : 0) + (culturesUnknown ? 4 : 0);
  return `${bits(allergens, ALLERGENS)} ${bits(cultures, CULTURES)} ${unknown} ${strongestOg}`;
}

function bits<T>(some: readonly T[], all: readonly T[]): number {
  let found = 0;
  for (const one of some) found |= 1 << all.indexOf(one);
  return found;
}
