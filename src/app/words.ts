import type { Role } from '#shared/api/people.ts';

export const ROLE_WORDS: Record<Role, string> = {
  'head-brewer': 'Head brewer',
  brewer: 'Brewer',
  taster: 'Taster',
};

export const ROLE_MEANING: Record<Role, string> = {
  'head-brewer': 'Everything: yeasts, vessels, the season, people, accepting a hold.',
  brewer: 'Adds, edits and moves batches and chains.',
  taster: 'Sees the board and joins the talk; changes nothing else.',
};
