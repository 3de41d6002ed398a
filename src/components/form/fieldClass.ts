import clsx from 'clsx';

/** Look of every box that is typed into. 16 px, or a phone zooms in. */
export const fieldClass = (bad: boolean, extra = '') =>
  clsx(
    'min-h-11 w-full min-w-0 rounded-field border-[1.5px] bg-white px-3 py-2 text-touch text-ink',
    'disabled:bg-line2 disabled:text-ink2',
    bad ? 'border-2 border-hold' : 'border-edge',
    extra,
  );
