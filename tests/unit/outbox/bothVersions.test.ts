import { expect, test } from 'vitest';
import { asWritten, bothVersions } from '../../../src/outbox/bothVersions.ts';
import type { Entry } from '../../../src/outbox/entry.ts';

const stopped = (body: object, current: unknown): Entry => ({
  id: 'a',
  personId: 'orla',
  contract: 1,
  madeAt: '',
  method: 'PUT',
  url: '/api/rows/r',
  body,
  what: '',
  page: '',
  touches: [],
  refusal: { status: 412, kind: 'changed-since', sentence: '', errors: [], current },
});

test('both versions are shown where they differ, as they were typed', () => {
  const mine = {
    shown: 1.012,
    notes: '',
    typed: { shown: { text: '3,1', unit: '°P' } },
    judged: 'fit',
  };
  const theirs = { id: 'r', version: 2, shown: 1.02, notes: 'Hazy', typed: {}, judged: 'fit' };
  expect(bothVersions(stopped(mine, theirs))).toEqual([
    { label: 'Reading', mine: '3,1 °P', theirs: '1.02' },
    { label: 'Notes', mine: '–', theirs: 'Hazy' },
  ]);
});

test('without a row on the server there is nothing to lay beside it', () => {
  expect(bothVersions(stopped({ text: 'a' }, undefined))).toEqual([]);
});

test('what is never taken is told field by field, to be written anew', () => {
  const body = { id: 'r', text: '', daysUnderBeer: 4, typed: {}, judged: 'fit', volumeL: null };
  expect(asWritten(stopped(body, undefined))).toEqual([
    { label: 'Days under beer', mine: '4' },
    { label: 'Judged', mine: 'fit' },
  ]);
});
