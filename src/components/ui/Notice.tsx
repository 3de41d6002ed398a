import clsx from 'clsx';
import type { ReactNode } from 'react';

const LOOK = {
  plain: 'border-line bg-bottle-l text-ink',
  pour: 'border-pour bg-pour-l text-pour',
  mind: 'border-mind bg-mind-l text-mind',
  hold: 'border-hold bg-hold-l text-hold',
} as const;

export interface NoticeProps {
  kind?: keyof typeof LOOK;
  children: ReactNode;
  /** Read out at once when it appears. */
  alert?: boolean;
  className?: string;
}

export function Notice({ kind = 'plain', children, alert = false, className }: NoticeProps) {
  return (
    <div
      {...(alert && { role: 'alert' })}
      className={clsx('rounded-xl border-[1.5px] px-4 py-3 leading-snug', LOOK[kind], className)}
    >
      {children}
    </div>
  );
}
