import * as contract from '#shared/api/pour.ts';
import { api } from '#shared/api/urls.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Answer, Asked, Operation } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canAcceptHolds, canRead, canSetStages, type InRole } from '../../policies.ts';
import { answerOverride, askOverride } from './clearance.ts';
import { leaveRun, openRun, takeOver, toStep } from './open.ts';
import { recordPour, signPour } from './pour.ts';
import { addReading, withdrawReading } from './readings.ts';
import { answerPour, byHolder, byHolderToTheEnd, onRun, readPour } from './scene.ts';

const path = (of: (slug: string, batchId: string) => string) => pathOf(of(':brewery', ':id'));

const PROBLEMS = [
  'pour-held',
  'pour-over',
  'not-cleared',
  'already-exists',
  'season-archived',
] as const;

/** Every command answers the run as it stands after it. */
function command<Body>(
  what: Pick<Operation<Body>, 'name' | 'path' | 'summary' | 'body'>,
  may: (member: InRole) => boolean,
  handle: (asked: Asked<Body>, member: Member) => Promise<Answer>,
) {
  const rest = { method: 'post', answer: contract.pourState, status: 200 } as const;
  return forMember({ ...what, ...rest, problems: PROBLEMS }, may, handle);
}

const read = forMember(
  {
    name: 'readPour',
    method: 'get',
    path: path(api.pour),
    summary: 'The newest pour run of a batch, and the server’s clock',
    answer: contract.pourState,
    status: 200,
  },
  canRead,
  async (asked, member) => ({ body: await readPour(asked, member) }),
);

const open = command(
  {
    name: 'openPour',
    path: path(api.pour),
    summary: 'Take the pour of a batch in hand',
    body: contract.pourOpening,
  },
  canSetStages,
  (asked, member) =>
    answerPour(asked, member, (hand, batchId) => openRun(hand, batchId, asked.body.id)),
);

const step = command(
  {
    name: 'stepPour',
    path: path(api.pourStep),
    summary: 'Go to a step of a pour, forward or back, with what was found',
    body: contract.pourStepRequest,
  },
  canSetStages,
  (asked, member) => byHolderToTheEnd(asked, member, toStep(asked.body)),
);

const reading = command(
  {
    name: 'readWort',
    path: path(api.pourReadings),
    summary: 'Write down a temperature of the wort',
    body: contract.wortReadingRequest,
  },
  canSetStages,
  (asked, member) => byHolder(asked, member, addReading(asked.body)),
);

const withdrawal = command(
  {
    name: 'withdrawWortReading',
    path: path(api.pourWithdrawals),
    summary: 'Take back a reading that was written down by mistake',
    body: contract.withdrawalRequest,
  },
  canSetStages,
  (asked, member) => byHolder(asked, member, withdrawReading(asked.body.readingId)),
);

const override = command(
  {
    name: 'askOverride',
    path: path(api.pourOverrides),
    summary: 'Ask for leave to pour where something holds',
    body: contract.overrideRequest,
  },
  canSetStages,
  (asked, member) => byHolder(asked, member, askOverride(asked.body)),
);

const answer = command(
  {
    name: 'answerOverride',
    path: path(api.pourAnswers),
    summary: 'Give or refuse leave to pour, with a reason',
    body: contract.overrideAnswer,
  },
  canAcceptHolds,
  (asked, member) => onRun(asked, member, answerOverride(asked.body)),
);

const done = command(
  {
    name: 'recordPour',
    path: path(api.pourDone),
    summary: 'Record that the wort was poured, with leave or without',
    body: contract.pourRequest,
  },
  canSetStages,
  (asked, member) => onRun(asked, member, recordPour(asked.body)),
);

const signature = command(
  {
    name: 'signPour',
    path: path(api.pourSignature),
    summary: 'Sign a reason for a pour without leave',
    body: contract.signatureRequest,
  },
  canAcceptHolds,
  (asked, member) => onRun(asked, member, signPour(asked.body.reason)),
);

const holder = command(
  {
    name: 'takeOverPour',
    path: path(api.pourHolder),
    summary: 'Take a pour over from who holds it',
    body: contract.runRequest,
  },
  canSetStages,
  (asked, member) => onRun(asked, member, takeOver),
);

const leaving = command(
  {
    name: 'leavePour',
    path: path(api.pourLeaving),
    summary: 'Leave a run without a pour',
    body: contract.runRequest,
  },
  canSetStages,
  (asked, member) => byHolder(asked, member, leaveRun),
);

export const pourRoutes = [
  read,
  open,
  step,
  reading,
  withdrawal,
  override,
  answer,
  done,
  signature,
  holder,
  leaving,
];
