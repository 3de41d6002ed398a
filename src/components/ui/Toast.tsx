import { Toaster as Sonner, toast } from 'sonner';

/** Short word of what was done. What went wrong stands where it went wrong, not here. */
export const say = (sentence: string) => toast(sentence);

export const Toaster = () => (
  <Sonner
    position="bottom-center"
    duration={5000}
    offset={24}
    mobileOffset={84}
    toastOptions={{
      unstyled: true,
      className:
        'w-full rounded-xl border border-line bg-ink px-4 py-3 text-body font-medium text-stone shadow-lg',
    }}
  />
);
