/**
 * Addresses of the API, in one place for server, pages and tests. A place is a brewery's slug, or
 * `slug/seasons/id` for a season that is not the current one; `:brewery` is the slug.
 */
const b = (place: string) => `/api/breweries/${encodeURIComponent(slugOf(place))}`;

/** What is read and changed in a season: the one that the place names, else the current one. */
const at = (place: string, rest: string) => {
  const season = seasonOf(place);
  return `${b(place)}${rest}${season === null ? '' : `?season=${season}`}`;
};

const WITH_SEASON = '/seasons/';
export const slugOf = (place: string): string => place.split(WITH_SEASON)[0] ?? place;
export const seasonOf = (place: string): string | null => place.split(WITH_SEASON)[1] ?? null;
export const placeOf = (slug: string, seasonId: string | null | undefined): string =>
  seasonId ? `${slug}${WITH_SEASON}${seasonId}` : slug;

export const api = {
  account: '/api/account',
  accountEmail: '/api/account/email',
  accountPassword: '/api/account/password',
  /** All that would go with the account, to take along. */
  accountData: '/api/account/data',
  accountClosing: '/api/account/closing',
  /** Where one is signed in. */
  signIns: '/api/account/sign-ins',
  signInOf: (mark: string) => `/api/account/sign-ins/${encodeURIComponent(mark)}`,
  session: '/api/session',
  join: (token: string) => `/api/join/${encodeURIComponent(token)}`,
  brewery: (slug: string) => at(slug, ''),
  breweries: '/api/breweries',
  members: (slug: string) => at(slug, '/members'),
  member: (slug: string, personId: string) => `${b(slug)}/members/${personId}`,
  handOver: (slug: string, personId: string) => `${b(slug)}/members/${personId}/hand-over`,
  /** One’s own: deleted, one has left. */
  membership: (slug: string) => `${b(slug)}/membership`,
  joinLinks: (slug: string) => at(slug, '/join-links'),
  joinLink: (slug: string, id: string) => at(slug, `/join-links/${id}`),
  board: (slug: string) => at(slug, '/board'),
  /** What the board does not tell of what is to be done today. */
  today: (slug: string) => at(slug, '/today'),
  seasons: (slug: string) => at(slug, '/seasons'),
  seasonArchive: (slug: string, id: string) => `${b(slug)}/seasons/${id}/archive`,
  currentSeason: (slug: string, id: string) => `${b(slug)}/seasons/${id}/current`,
  season: (slug: string, id: string) => `${b(slug)}/seasons/${id}`,
  /** Server-Sent Events. */
  seasonEvents: (slug: string, id: string) => `${b(slug)}/seasons/${id}/events`,
  /** Everything that happened in a season, newest first. */
  changes: (slug: string, seasonId: string) => `${b(slug)}/seasons/${seasonId}/changes`,
  houseRules: (slug: string) => at(slug, '/house-rules'),
  yeasts: (slug: string) => at(slug, '/yeasts'),
  yeast: (slug: string, id: string) => at(slug, `/yeasts/${id}`),
  vessels: (slug: string) => at(slug, '/vessels'),
  vessel: (slug: string, id: string) => at(slug, `/vessels/${id}`),
  chains: (slug: string) => at(slug, '/chains'),
  chain: (slug: string, id: string) => at(slug, `/chains/${id}`),
  pullDates: (slug: string, id: string) => at(slug, `/chains/${id}/pull`),
  /** The talk of a chain. */
  comments: (slug: string, id: string) => at(slug, `/chains/${id}/comments`),
  comment: (slug: string, id: string, commentId: string) =>
    at(slug, `/chains/${id}/comments/${commentId}`),
  commentsSeen: (slug: string, id: string) => at(slug, `/chains/${id}/comments/seen`),
  /** Read-only links to one chain. */
  shareLinks: (slug: string, chainId: string) => at(slug, `/chains/${chainId}/share-links`),
  shareLink: (slug: string, id: string) => at(slug, `/share-links/${id}`),
  /** People of other breweries on one chain. */
  guests: (slug: string, chainId: string) => at(slug, `/chains/${chainId}/guests`),
  guest: (slug: string, id: string) => at(slug, `/guests/${id}`),
  /** A chain of another brewery on one’s own board: deleted, one has left it. */
  guestShelf: (guestId: string) => `/api/guest-shelves/${guestId}`,
  guestInvitation: (token: string) => `/api/guest/${encodeURIComponent(token)}`,
  /** What such a link shows. */
  shared: (token: string) => `/api/shared/${encodeURIComponent(token)}`,
  copies: (slug: string) => at(slug, '/copies'),
  batches: (slug: string) => at(slug, '/batches'),
  batch: (slug: string, id: string) => at(slug, `/batches/${id}`),
  batchStage: (slug: string, id: string) => at(slug, `/batches/${id}/stage`),
  /** Readings, notes, events and the cake check of a batch. */
  batchRecord: (slug: string, id: string) => at(slug, `/batches/${id}/record`),
  readings: (slug: string, id: string) => at(slug, `/batches/${id}/readings`),
  reading: (slug: string, id: string, readingId: string) =>
    at(slug, `/batches/${id}/readings/${readingId}`),
  notes: (slug: string, id: string) => at(slug, `/batches/${id}/notes`),
  note: (slug: string, id: string, noteId: string) => at(slug, `/batches/${id}/notes/${noteId}`),
  events: (slug: string, id: string) => at(slug, `/batches/${id}/events`),
  event: (slug: string, id: string, eventId: string) =>
    at(slug, `/batches/${id}/events/${eventId}`),
  cakeCheck: (slug: string, id: string) => at(slug, `/batches/${id}/cake-check`),
  instruments: (slug: string) => at(slug, '/instruments'),
  instrument: (slug: string, id: string) => at(slug, `/instruments/${id}`),
  /** The link from the batch before to this one. */
  link: (slug: string, id: string) => at(slug, `/batches/${id}/link`),
  acceptance: (slug: string, id: string) => at(slug, `/batches/${id}/link/acceptance`),
  /** The pour of a batch's wort onto the cake before it, and its commands. */
  pour: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour`),
  pourStep: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/step`),
  pourReadings: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/readings`),
  pourWithdrawals: (slug: string, batchId: string) =>
    at(slug, `/batches/${batchId}/pour/withdrawals`),
  pourOverrides: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/overrides`),
  pourAnswers: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/answers`),
  pourDone: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/done`),
  pourSignature: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/signature`),
  /** Take the run over from who holds it. */
  pourHolder: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/holder`),
  /** Leave the run without a pour. */
  pourLeaving: (slug: string, batchId: string) => at(slug, `/batches/${batchId}/pour/leaving`),
  moves: (slug: string) => at(slug, '/moves'),
  undo: (slug: string) => at(slug, '/undo'),
  redo: (slug: string) => at(slug, '/redo'),
  checkChain: '/api/check/chain',
  checkPour: '/api/check/pour',
  openapi: '/api/openapi.json',
  health: '/api/health',
  ready: '/api/ready',
  clientErrors: '/api/client-errors',
} as const;
