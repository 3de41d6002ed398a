import { expect, it } from 'vitest';
import { OfflineError, ProblemError } from '../../../src/api/errors.ts';
import { sortErrors } from '../../../src/components/form/sortErrors.ts';

const refusal = (errors: { pointer: string; detail: string }[]) =>
  new ProblemError({ type: '/problems/invalid', title: 'Not valid', status: 422, errors });

it('puts a refusal at the field it names, and the rest at the form', () => {
  const error = refusal([
    { pointer: '/dryHops/0/day', detail: 'Too late' },
    { pointer: '/colour', detail: 'Unheard of' },
  ]);
  expect(sortErrors(error, ['name', 'dryHops'])).toEqual({
    fields: [{ path: 'dryHops.0.day', detail: 'Too late' }],
    rest: 'Unheard of',
  });
});

it('says a failure of another kind in a sentence of the form', () => {
  const { fields, rest } = sortErrors(new OfflineError(), ['name']);
  expect(fields).toEqual([]);
  expect(rest).toContain('No connection');
});
