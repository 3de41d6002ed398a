import type { Page } from '@playwright/test';
import { expect } from './test.ts';

export interface Beer {
  readonly name: string;
  readonly style: string;
  readonly og: string;
  readonly srm: string;
  readonly ibu: string;
  readonly volume?: string;
}

/** Types a beer into the open form; what is usual is left as the form proposes it. */
export async function typeBeer(page: Page, beer: Beer): Promise<void> {
  const form = page.getByRole('dialog', { name: 'New batch' });
  const field = (label: string) => form.getByLabel(label, { exact: true });
  await field('Name').fill(beer.name);
  await field('Style').fill(beer.style);
  if (beer.volume) await field('Volume').fill(beer.volume);
  await field('Original gravity').fill(beer.og);
  await field('Colour').fill(beer.srm);
  await field('Bitterness').fill(beer.ibu);
  await form.getByRole('button', { name: 'Put on the bench' }).click();
  await expect(form).toBeHidden();
}
