import { lazy, Suspense } from 'react';

/** Short word of what was done. What went wrong stands where it went wrong, not here. */
export async function say(sentence: string): Promise<void> {
  const { toast } = await import('sonner');
  toast(sentence);
}

/** Loaded beside the page, not before it: nothing is said in its first moment. */
const Sonner = lazy(async () => ({ default: (await import('sonner')).Toaster }));

export const Toaster = () => (
  <Suspense>
    <Sonner
      position="bottom-center"
      duration={5000}
      offset={24}
      mobileOffset={84}
      toastOptions={{
        unstyled: true,
        className:
          'w-full rounded-xl border border-line bg-ink px-4 py-3 font-sans text-body font-medium text-stone shadow-card',
      }}
    />
  </Suspense>
);
