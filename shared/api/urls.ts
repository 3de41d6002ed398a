/** Addresses of the API, in one place for server, pages and tests. `:brewery` is the slug. */
const b = (slug: string) => `/api/breweries/${encodeURIComponent(slug)}`;

export const api = {
  account: '/api/account',
  session: '/api/session',
  join: (token: string) => `/api/join/${encodeURIComponent(token)}`,
  brewery: (slug: string) => b(slug),
  members: (slug: string) => `${b(slug)}/members`,
  joinLinks: (slug: string) => `${b(slug)}/join-links`,
  joinLink: (slug: string, id: string) => `${b(slug)}/join-links/${id}`,
  board: (slug: string) => `${b(slug)}/board`,
  season: (slug: string, id: string) => `${b(slug)}/seasons/${id}`,
  /** Server-Sent Events. */
  seasonEvents: (slug: string, id: string) => `${b(slug)}/seasons/${id}/events`,
  /** Everything that happened in a season, newest first. */
  changes: (slug: string, seasonId: string) => `${b(slug)}/seasons/${seasonId}/changes`,
  houseRules: (slug: string) => `${b(slug)}/house-rules`,
  yeasts: (slug: string) => `${b(slug)}/yeasts`,
  yeast: (slug: string, id: string) => `${b(slug)}/yeasts/${id}`,
  vessels: (slug: string) => `${b(slug)}/vessels`,
  vessel: (slug: string, id: string) => `${b(slug)}/vessels/${id}`,
  chains: (slug: string) => `${b(slug)}/chains`,
  chain: (slug: string, id: string) => `${b(slug)}/chains/${id}`,
  pullDates: (slug: string, id: string) => `${b(slug)}/chains/${id}/pull`,
  /** The talk of a chain. */
  comments: (slug: string, id: string) => `${b(slug)}/chains/${id}/comments`,
  comment: (slug: string, id: string, commentId: string) =>
    `${b(slug)}/chains/${id}/comments/${commentId}`,
  commentsSeen: (slug: string, id: string) => `${b(slug)}/chains/${id}/comments/seen`,
  /** Read-only links to one chain. */
  shareLinks: (slug: string, chainId: string) => `${b(slug)}/chains/${chainId}/share-links`,
  shareLink: (slug: string, id: string) => `${b(slug)}/share-links/${id}`,
  /** People of other breweries on one chain. */
  guests: (slug: string, chainId: string) => `${b(slug)}/chains/${chainId}/guests`,
  guest: (slug: string, id: string) => `${b(slug)}/guests/${id}`,
  guestInvitation: (token: string) => `/api/guest/${encodeURIComponent(token)}`,
  /** What such a link shows. */
  shared: (token: string) => `/api/shared/${encodeURIComponent(token)}`,
  copies: (slug: string) => `${b(slug)}/copies`,
  batches: (slug: string) => `${b(slug)}/batches`,
  batch: (slug: string, id: string) => `${b(slug)}/batches/${id}`,
  batchStage: (slug: string, id: string) => `${b(slug)}/batches/${id}/stage`,
  /** The link from the batch before to this one. */
  link: (slug: string, id: string) => `${b(slug)}/batches/${id}/link`,
  acceptance: (slug: string, id: string) => `${b(slug)}/batches/${id}/link/acceptance`,
  moves: (slug: string) => `${b(slug)}/moves`,
  undo: (slug: string) => `${b(slug)}/undo`,
  redo: (slug: string) => `${b(slug)}/redo`,
  checkChain: '/api/check/chain',
  openapi: '/api/openapi.json',
  health: '/api/health',
  ready: '/api/ready',
  clientErrors: '/api/client-errors',
} as const;
