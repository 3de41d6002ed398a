import { useRef } from 'react';
import type { LinkPatch } from '#shared/api/batch.ts';
import type { Typed } from '#shared/api/units.ts';
import { useLinkPatch } from '../../../api/links.ts';
import { useBoardView } from '../view/BoardView.tsx';
import type { Kept, LinkDraft } from './useLinkDraft.ts';

export type SaveKept = (kept: Kept, typed: Typed[string] | null) => void;

function patchOf({ later }: LinkDraft, kept: Kept, typed: Typed[string] | null): LinkPatch {
  const { keepL: _, ...others } = later.link.typed;
  return {
    keepL: typeof kept === 'number' ? kept : null,
    keepWhole: kept === 'whole',
    typed: typed ? { ...others, keepL: typed } : others,
  };
}

/** Stores the kept part. One change after the other: each is made from the version before it. */
export function useSaveKept(draft: LinkDraft) {
  const { slug } = useBoardView();
  const { mutateAsync, error } = useLinkPatch(slug);
  const last = useRef<Promise<number>>(Promise.resolve(0));
  const save: SaveKept = (kept, typed) => {
    const { later, tryKept } = draft;
    tryKept(kept);
    const patch = patchOf(draft, kept, typed);
    const send = async (known: number) => {
      const version = Math.max(known, later.version);
      return (await mutateAsync({ id: later.id, version, patch })).version;
    };
    const sent = last.current.then(send);
    // A failure is told by `error`, and what was tried stays in sight.
    const settled = sent.catch(() => 0);
    last.current = settled;
    void settled.then((version) => {
      if (version > 0 && last.current === settled) tryKept(null);
    });
  };
  return { save, error };
}
