import type { Clock } from '../clock.ts';
import type { Db } from './client.ts';

/** The demo brewery, once. */
export async function seedDemo(_db: Db, _clock: Clock): Promise<void> {}
