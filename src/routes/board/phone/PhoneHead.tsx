import { Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import { Menu, MenuItem } from '../../../components/ui/Menu.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';

/** Name of what is shown, its sum, and what may be begun. */
export function PhoneHead({ title, children }: { title: ReactNode; children: ReactNode }) {
  return (
    <header className="flex items-end gap-3 px-[18px]">
      <div className="min-w-0 flex-1">
        <h1 className="line-clamp-3 text-[1.6875rem] leading-[1.1]">{title}</h1>
        <div className="mt-px text-small text-ink2">{children}</div>
      </div>
      <AddMenu />
    </header>
  );
}

function AddMenu() {
  const { can } = useBoardView();
  const { open } = useBoardPanel();
  if (!can.editBatches && !can.editChains) return null;
  return (
    <Menu
      button={{
        'aria-label': 'New batch or shelf',
        className:
          'grid size-[46px] shrink-0 place-items-center rounded-[14px] bg-bottle text-on-bottle',
        children: <Plus size={24} strokeWidth={2.4} aria-hidden />,
      }}
    >
      {can.editBatches && (
        <MenuItem onSelect={() => open({ kind: 'new', what: 'batch' })}>New batch</MenuItem>
      )}
      {can.editChains && (
        <MenuItem onSelect={() => open({ kind: 'new', what: 'chain' })}>New shelf</MenuItem>
      )}
    </Menu>
  );
}
