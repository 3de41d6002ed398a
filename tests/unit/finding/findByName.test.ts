import { expect, it } from 'vitest';
import { findByName, type Found } from '../../../src/routes/find/findByName.ts';

const all = ['Low Tide Blonde', 'Spring Tide', 'Tidewater', 'Flat Kölsch', 'Untidy'].map(
  (name): Found => ({ id: name, kind: 'batch', name, where: 'on the bench' }),
);
const names = (text: string) => findByName(all, text).map(({ name }) => name);

it.each([
  ['tid', ['Tidewater', 'Low Tide Blonde', 'Spring Tide', 'Untidy']],
  ['  KOLSCH ', ['Flat Kölsch']],
  ['kö', ['Flat Kölsch']],
  ['(.*', []],
  ['', all.map(({ name }) => name)],
])('%j finds %j', (text, found) => {
  expect(names(text)).toEqual(found);
});
