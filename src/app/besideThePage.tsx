import { lazy, Suspense, type ComponentType } from 'react';

/**
 * The outbox, and the word of a new version, come beside the first page, not before it: what waits
 * is on the device and can be told of a moment later. Where the connection goes before they came,
 * the page is as it was without.
 */
function beside(load: () => Promise<ComponentType>) {
  const Part = lazy(async () => {
    const found = await load().catch(() => null);
    return { default: found ?? Nothing };
  });
  return function Beside() {
    return (
      <Suspense>
        <Part />
      </Suspense>
    );
  };
}

const Nothing = () => null;

export const OutboxMark = beside(async () => (await import('../outbox/OutboxMark.tsx')).OutboxMark);
export const StoppedStrip = beside(
  async () => (await import('../outbox/StoppedStrip.tsx')).StoppedStrip,
);
export const NewRelease = beside(
  async () => (await import('../release/NewRelease.tsx')).NewRelease,
);
