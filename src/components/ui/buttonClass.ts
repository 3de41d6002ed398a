import clsx from 'clsx';

export type ButtonLook = 'first' | 'plain' | 'quiet' | 'danger' | 'text';
export type ButtonSize = 'small' | 'normal' | 'large';

const LOOKS: Record<ButtonLook, string> = {
  first: 'border-bottle bg-bottle text-on-bottle hover:not-disabled:brightness-110',
  plain: 'border-ink bg-white text-ink hover:not-disabled:bg-bottle-l',
  quiet: 'border-edge bg-white text-ink font-medium hover:not-disabled:bg-bottle-l',
  danger: 'border-hold bg-hold-l text-hold hover:not-disabled:brightness-95',
  text: 'border-transparent bg-transparent text-ink underline underline-offset-4 hover:not-disabled:bg-line2',
};

const SIZES: Record<ButtonSize, string> = {
  small: 'min-h-8 rounded-lg px-3 py-1 text-small max-tablet:min-h-11',
  normal: 'min-h-10 rounded-button px-4 py-2 text-body max-tablet:min-h-11',
  large: 'min-h-12 rounded-xl px-5 py-3 text-touch',
};

/** The one look of buttons and of links that stand as buttons. */
export const buttonClass = (look: ButtonLook = 'plain', size: ButtonSize = 'normal', extra = '') =>
  clsx(
    'inline-flex items-center justify-center gap-2 border-[1.5px] font-semibold whitespace-nowrap transition-colors duration-90',
    'disabled:cursor-not-allowed disabled:border-line disabled:bg-line2 disabled:text-ink2',
    LOOKS[look],
    SIZES[size],
    extra,
  );
