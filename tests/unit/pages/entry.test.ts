import { describe, expect, it } from 'vitest';
import { signInRequest, signUpRequest } from '#shared/api/people.ts';
import { judged } from '../../../src/routes/public/entry.ts';

describe('a form of a page that anyone may open', () => {
  it('gives the values as the contract reads them', () => {
    const texts = {
      name: ' Orla Finch ',
      email: 'orla@reedbed.example',
      password: 'reeds in wind',
    };
    expect(judged(signUpRequest, texts)).toEqual({
      ok: true,
      values: { ...texts, name: 'Orla Finch' },
    });
  });

  it('names every field that wants another look, with one sentence each', () => {
    const answer = judged(signUpRequest, { name: '', email: 'orla', password: 'short' });
    if (answer.ok) throw new Error('It was let through');
    expect(Object.keys(answer.faults)).toEqual(['name', 'email', 'password']);
    expect(answer.faults.name).toBe('Write a name');
  });

  it('asks for a field that is missing in plain words', () => {
    const answer = judged(signInRequest, { email: 'orla@reedbed.example' });
    expect(answer).toEqual({ ok: false, faults: { password: 'Fill this in' } });
  });
});
