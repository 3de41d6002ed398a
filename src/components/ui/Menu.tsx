import clsx from 'clsx';
import { DropdownMenu as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { MENUS } from '../../app/menus.ts';

export interface MenuProps {
  /** The button that opens it; takes the props that it is given. */
  trigger: ReactNode;
  children: ReactNode;
  align?: 'start' | 'end';
}

export function Menu({ trigger, children, align = 'end' }: MenuProps) {
  return (
    <Radix.Root modal={false}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal container={document.getElementById(MENUS)}>
        <Radix.Content
          align={align}
          sideOffset={6}
          collisionPadding={8}
          className="z-50 max-h-[var(--radix-dropdown-menu-content-available-height)] min-w-48 overflow-y-auto rounded-xl border border-line bg-white p-1.5 text-ink shadow-lg"
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

const ITEM =
  'flex min-h-9 cursor-pointer items-center gap-2 rounded-lg px-3 py-1.5 text-body outline-none select-none data-highlighted:bg-bottle-l max-tablet:min-h-11 data-disabled:cursor-not-allowed data-disabled:text-ink3';

export interface MenuItemProps {
  children: ReactNode;
  onSelect?: () => void;
  disabled?: boolean;
  danger?: boolean;
  /** For a link inside: the child takes the place of the item. */
  asChild?: boolean;
}

export function MenuItem({ children, onSelect, disabled, danger, asChild }: MenuItemProps) {
  return (
    <Radix.Item
      {...(asChild && { asChild: true })}
      {...(disabled && { disabled: true })}
      {...(onSelect && { onSelect })}
      className={clsx(ITEM, danger && 'text-hold')}
    >
      {children}
    </Radix.Item>
  );
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return (
    <Radix.Label className="px-3 pt-2 pb-1 text-small font-semibold text-ink2">
      {children}
    </Radix.Label>
  );
}

export const MenuSeparator = () => <Radix.Separator className="mx-2 my-1.5 h-px bg-line" />;
