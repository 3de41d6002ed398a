import type { Request } from 'express';
import { problem } from '../problems.ts';

export const entityTag = (version: number) => `"${version}"`;

/**
 * The version that a change was made from. A tag that we never gave matches nothing, so it is
 * told apart from a missing one: 0 equals no row's version.
 */
export function versionAsked(req: Request): number {
  const header = req.get('if-match');
  if (header === undefined) throw problem('version-missing');
  const found = /^\s*(?:W\/)?"(\d{1,9})"\s*$/.exec(header);
  return found ? Number(found[1]) : 0;
}

/** Refuses a change that was made from another version than the row has, showing the row as it is. */
export function demandVersion(asked: number, actual: number, current: unknown): void {
  if (asked !== actual) throw problem('changed-since', { current });
}
