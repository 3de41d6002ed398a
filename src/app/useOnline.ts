import { useSyncExternalStore } from 'react';
import { isOnline, onConnectionChange } from '../api/connection.ts';

/** False while the browser has no network or the server gave no answer to the last request. */
export const useOnline = () => useSyncExternalStore(onConnectionChange, isOnline, () => true);
