import clsx from 'clsx';
import {
  createContext,
  use,
  useId,
  useRef,
  useState,
  type ComponentProps,
  type ReactNode,
  type RefObject,
} from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { onMenuKey } from './menuKeys.ts';
import { useMenuPlace } from './useMenuPlace.ts';

/** Closes the menu around an item, with the focus back on its button. */
const CloseMenu = createContext<() => void>(() => undefined);

export interface MenuProps {
  /** The button that opens it. */
  button: ComponentProps<'button'>;
  children: ReactNode;
  align?: 'start' | 'end';
}

/** A button with a menu, which the browser shows above everything else. */
export function Menu({ button, children, align = 'end' }: MenuProps) {
  const id = useId();
  const [openedBy, setOpenedBy] = useState<'keys' | 'pointer' | null>(null);
  const opener = useRef<HTMLButtonElement>(null);
  const isOpen = openedBy !== null;
  const close = () => {
    opener.current?.focus({ preventScroll: true });
    setOpenedBy(null);
  };
  return (
    <>
      <button
        type="button"
        {...button}
        ref={opener}
        id={`${id}-button`}
        aria-haspopup="menu"
        aria-expanded={isOpen}
        aria-controls={isOpen ? `${id}-menu` : undefined}
        onClick={(event) => (isOpen ? close() : setOpenedBy(event.detail > 0 ? 'pointer' : 'keys'))}
        onKeyDown={(event) => {
          if (event.key !== 'ArrowDown' || isOpen) return;
          event.preventDefault();
          setOpenedBy('keys');
        }}
      />
      {isOpen && (
        <CloseMenu value={close}>
          <OpenMenu id={id} byKeys={openedBy === 'keys'} {...{ opener, align, close }}>
            {children}
          </OpenMenu>
        </CloseMenu>
      )}
    </>
  );
}

interface OpenMenuProps {
  id: string;
  byKeys: boolean;
  opener: RefObject<HTMLButtonElement | null>;
  align: 'start' | 'end';
  close: () => void;
  children: ReactNode;
}

function OpenMenu({ id, byKeys, opener, align, close, children }: OpenMenuProps) {
  const menu = useMenuPlace({ opener, align, byKeys, close });
  return (
    <div
      ref={menu}
      id={`${id}-menu`}
      popover="manual"
      role="menu"
      tabIndex={-1}
      aria-labelledby={`${id}-button`}
      onKeyDown={(event) => onMenuKey(event, close)}
      className="fixed inset-auto min-w-48 overflow-y-auto rounded-xl border border-line bg-white p-1.5 text-left font-sans text-body font-normal whitespace-normal text-ink shadow-lg outline-none"
    >
      {children}
    </div>
  );
}

const ITEM =
  'flex min-h-9 w-full cursor-pointer items-center gap-2 rounded-lg px-3 py-1.5 text-left text-body outline-none select-none hover:bg-bottle-l focus:bg-bottle-l aria-disabled:text-ink3 max-tablet:min-h-11';

export interface MenuItemProps {
  children: ReactNode;
  onSelect: () => void;
  disabled?: boolean;
  danger?: boolean;
}

export function MenuItem({ children, onSelect, disabled = false, danger = false }: MenuItemProps) {
  const close = use(CloseMenu);
  const choose = () => {
    if (disabled) return;
    close();
    onSelect();
  };
  return (
    <button
      type="button"
      role="menuitem"
      tabIndex={-1}
      aria-disabled={disabled}
      onClick={choose}
      className={clsx(ITEM, danger && 'text-hold')}
    >
      {children}
    </button>
  );
}

/** An item that leads to a page. */
export function MenuLink(props: LinkProps) {
  const close = use(CloseMenu);
  return <Link role="menuitem" tabIndex={-1} onClick={close} className={ITEM} {...props} />;
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return (
    <p role="presentation" className="px-3 pt-2 pb-1 text-small font-semibold text-ink2">
      {children}
    </p>
  );
}

export const MenuSeparator = () => <div role="separator" className="mx-2 my-1.5 h-px bg-line" />;
