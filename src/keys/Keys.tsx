import { useSyncExternalStore } from 'react';
import { useNavigate } from 'react-router-dom';
import { lazyPart } from '../app/lazyPart.tsx';
import { useBrewery } from '../app/useBrewery.ts';
import { findStore, keysStore } from './findStore.ts';
import { useShortcut } from './useShortcut.ts';

const FindDialog = lazyPart(async () => (await import('../routes/find/FindDialog.tsx')).FindDialog);
const KeysDialog = lazyPart(async () => (await import('./KeysDialog.tsx')).KeysDialog);

/** The keys that work on every page of a brewery, and what they open. */
export function Keys() {
  const { path } = useBrewery();
  const navigate = useNavigate();
  const isFinding = useSyncExternalStore(findStore.subscribe, findStore.get);
  const areTold = useSyncExternalStore(keysStore.subscribe, keysStore.get);
  useShortcut('find', () => findStore.set(true));
  useShortcut('keys', () => keysStore.set(true));
  useShortcut('board', () => void navigate(path()));
  useShortcut('record', () => void navigate(path('record')));
  return (
    <>
      {isFinding && <FindDialog onClose={() => findStore.set(false)} />}
      {areTold && <KeysDialog onClose={() => keysStore.set(false)} />}
    </>
  );
}
