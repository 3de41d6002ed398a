import type { Role } from '#shared/api/people.ts';

/** Invented people; their password is public, so they are only made where the demo is asked for. */
export const DEMO_PASSWORD = 'slack-water-26';

export const DEMO_PEOPLE: readonly { name: string; email: string; role: Role }[] = [
  { name: 'Mo', email: 'mo@saltmarsh.example', role: 'head-brewer' },
  { name: 'Tamsin', email: 'tamsin@saltmarsh.example', role: 'brewer' },
  { name: 'Ruth', email: 'ruth@saltmarsh.example', role: 'taster' },
];

export const DEMO_BREWERY = {
  slug: 'saltmarsh-brewers',
  name: 'Saltmarsh Brewers',
  timeZone: 'Europe/London',
  currency: 'USD',
} as const;
export const DEMO_SEASON = 'Spring season';
