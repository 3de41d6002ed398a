import { QueryClient, QueryObserver } from '@tanstack/react-query';
import { expect, test, vi } from 'vitest';
import { forgetAnswers } from '../../../src/api/forgetAnswers.ts';

const SESSION = ['session'];
const client = () => {
  const made = new QueryClient();
  made.setQueryData(SESSION, null);
  return made;
};

test('what nobody shows is forgotten at once, all but the one', () => {
  const it = client();
  it.setQueryData(['board'], 'read');
  forgetAnswers(it, { but: SESSION });
  expect(
    it
      .getQueryCache()
      .getAll()
      .map(({ queryKey }) => queryKey),
  ).toEqual([SESSION]);
});

test('what a page shows is not asked for anew as it is drawn again, and goes with the page', async () => {
  const it = client();
  const ask = vi.fn<() => Promise<string>>(async () => 'read');
  const options = { queryKey: ['board'], queryFn: ask, staleTime: Infinity };
  const board = new QueryObserver(it, options);
  const leave = board.subscribe(() => {});
  await vi.waitFor(() => expect(board.getCurrentResult().data).toBe('read'));

  forgetAnswers(it, { but: SESSION });
  board.setOptions({ ...options });
  expect(ask).toHaveBeenCalledOnce();
  leave();
  expect(it.getQueryData(['board'])).toBeUndefined();
});

test('what another page reads afterwards stays as it goes', async () => {
  const it = client();
  forgetAnswers(it, { but: SESSION });
  it.setQueryData(['share'], 'read');
  const leave = new QueryObserver(it, { queryKey: ['share'], enabled: false }).subscribe(() => {});
  leave();
  expect(it.getQueryData(['share'])).toBe('read');
});
