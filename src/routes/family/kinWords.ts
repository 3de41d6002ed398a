import type { Chain } from '#shared/api/chain.ts';

/** What a tree starts from. */
export function startWords({ start }: Chain): string {
  switch (start.kind) {
    case 'pack':
      return 'fresh pack';
    case 'outside':
      return 'from outside';
    case 'cake':
      return 'a cake that is gone';
  }
}
