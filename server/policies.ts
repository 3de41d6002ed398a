import type { Abilities, Role } from '#shared/api/people.ts';

/** Whoever is in a brewery, in a role. One function an action, for the routes and for the pages. */
export interface InRole {
  role: Role;
  /** Not null: somebody of another brewery, who stays within their chains. */
  guestOf?: ReadonlyMap<string, unknown> | null;
  /** The season that is asked for is put away. */
  isArchived?: boolean;
}

const isHead = ({ role }: InRole) => role === 'head-brewer';
const isMember = ({ guestOf }: InRole) => !guestOf;
const brews = ({ role }: InRole) => role === 'head-brewer' || role === 'brewer';

export const canRead = (_member: InRole) => true;
export const canEditBatches = brews;
export const canMoveBatches = brews;
/** To another shelf, a new one or the bench. */
export const canMoveAcross = (who: InRole) => brews(who) && isMember(who);
export const canSetStages = canMoveAcross;
export const canEditChains = canMoveAcross;
export const canEditYeastsAndVessels = isHead;
export const canEditSeason = isHead;
export const canAcceptHolds = isHead;
export const canInvite = isHead;
export const canManagePeople = isHead;
/** Readings, notes and cake checks of a batch. */
export const canWriteRecords = canMoveAcross;
/** Tasters too: what they taste is what the talk is about. */
export const canTalk = canRead;
/** Those of others; one's own anybody may. */
export const canRemoveComments = isHead;
/** Links to a chain, and guests on it. */
export const canShare = isHead;
export const canSeeSharing = brews;

/** What the pages offer. On an archived season nothing is changed, whoever asks. */
export const abilitiesOf = (who: InRole): Abilities => {
  const member: InRole = who.isArchived ? { ...who, role: 'taster' } : who;
  return {
    editBatches: canEditBatches(member),
    moveBatches: canMoveBatches(member),
    moveAcross: canMoveAcross(member),
    setStages: canSetStages(member),
    editChains: canEditChains(member),
    editYeastsAndVessels: canEditYeastsAndVessels(member),
    editSeason: canEditSeason(member),
    acceptHolds: canAcceptHolds(member),
    invite: canInvite(who),
  };
};
