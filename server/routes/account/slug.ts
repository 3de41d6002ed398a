import { randomInt } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';

/** A name as it can stand in an address: "Saltmarsh Brewers" becomes `saltmarsh-brewers`. */
export function slugOf(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .replace(/-+$/, '');
  return plain.length >= 2 ? plain : `brewery-${plain}`.replace(/-$/, '');
}

/** The first that is free of: the name, the name with a number. */
export async function freeSlug(tx: Tx, name: string): Promise<string> {
  const base = slugOf(name);
  for (const slug of [base, `${base}-2`, `${base}-3`]) {
    const taken = await tx.select({ id: brewery.id }).from(brewery).where(eq(brewery.slug, slug));
    if (taken.length === 0) return slug;
  }
  return `${base}-${randomInt(100_000, 1_000_000)}`;
}
