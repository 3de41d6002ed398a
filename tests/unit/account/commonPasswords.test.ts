import { expect, it } from 'vitest';
import { demandUncommon, isCommon } from '../../../server/auth/commonPasswords.ts';
import { ProblemError } from '../../../server/problems.ts';

it.each(['qwertyuiop', 'QwertyUIOP', '1234567890'])(
  'knows %s as one that is guessed first, whatever its capitals',
  (password) => expect(isCommon(password)).toBe(true),
);

it.each(['slack-water-26', 'sallow by the water', 'qwertyuiop and a gull'])(
  'lets %s be',
  (each) => {
    expect(isCommon(each)).toBe(false);
    expect(() => demandUncommon(each)).not.toThrow();
  },
);

it('says at the field what to do', () => {
  try {
    demandUncommon('qwertyuiop', '/newPassword');
    expect.unreachable();
  } catch (error) {
    if (!(error instanceof ProblemError)) throw error;
    expect(error.kind).toBe('invalid-request');
    expect(error.options.errors).toEqual([
      { pointer: '/newPassword', detail: expect.stringMatching(/choose another/) },
    ]);
  }
});
