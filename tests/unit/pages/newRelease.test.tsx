// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, expect, test, vi } from 'vitest';
import { useUnsaved } from '../../../src/app/unsaved.ts';
import { NewRelease } from '../../../src/release/NewRelease.tsx';
import { releaseStore } from '../../../src/release/releaseStore.ts';

afterEach(cleanup);

function Form({ hasTyped }: { hasTyped: boolean }) {
  useUnsaved(hasTyped);
  return null;
}

test('a new version is asked about, and never loads an open form away', () => {
  const { rerender } = render(
    <>
      <Form hasTyped />
      <NewRelease />
    </>,
  );
  expect(screen.queryByRole('region', { name: 'New version' })).toBeNull();

  const take = vi.fn<() => void>();
  releaseStore.ready(take);
  rerender(
    <>
      <Form hasTyped />
      <NewRelease />
    </>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Use it now' }));
  expect(take, 'not while something is typed').not.toHaveBeenCalled();
  expect(screen.getByRole('status').textContent).toContain('Something you typed is not saved');

  rerender(
    <>
      <Form hasTyped={false} />
      <NewRelease />
    </>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Use it now' }));
  expect(take).toHaveBeenCalledTimes(1);
});

test('it can be put off', () => {
  releaseStore.ready(vi.fn());
  render(<NewRelease />);
  fireEvent.click(screen.getByRole('button', { name: 'Later' }));
  expect(screen.queryByRole('region', { name: 'New version' })).toBeNull();
});
