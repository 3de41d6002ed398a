import { dictionary } from '@zxcvbn-ts/language-common';
import { newPassword } from '#shared/api/people.ts';
import { invalidField } from '../problems.ts';

const folded = (password: string) => password.normalize('NFC').toLowerCase();

/** Those of the list that the contract would let through: shorter ones are refused by their length. */
const COMMON: ReadonlySet<string> = new Set(
  dictionary['passwords-common'].map(folded).filter((each) => newPassword.safeParse(each).success),
);

export const isCommon = (password: string): boolean => COMMON.has(folded(password));

/** Refuses what whoever guesses tries first, whatever its capitals. */
export function demandUncommon(password: string, pointer = '/password'): void {
  if (isCommon(password))
    throw invalidField(
      pointer,
      'This is among the passwords that are guessed first: choose another, such as a short sentence of your own',
    );
}
