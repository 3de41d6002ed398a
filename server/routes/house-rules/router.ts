import { houseRules as contract, houseRulesRequest } from '#shared/api/houseRules.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditSeason, canRead } from '../../policies.ts';
import { changeShared } from '../board/changeBoard.ts';
import { changeHouseRules, readHouseRules } from './commands.ts';

const path = pathOf(api.houseRules(':brewery'));

export const houseRulesRoutes = [
  forMember(
    {
      name: 'readHouseRules',
      method: 'get',
      path,
      summary: 'What a brewery changed of the rules’ limits, with the history',
      answer: contract,
      status: 200,
    },
    canRead,
    async ({ db }, { brewery }) => {
      const body = await readHouseRules(db, brewery);
      return { body, version: body.version };
    },
  ),
  forMember(
    {
      name: 'changeHouseRules',
      method: 'put',
      path,
      summary: 'Change the limits of the rules, and which holds are shown as a mind',
      body: houseRulesRequest,
      answer: contract,
      status: 200,
      ifMatch: true,
      problems: ['season-archived'],
    },
    canEditSeason,
    async (asked, member) => {
      await changeShared(asked, member, changeHouseRules(asked.version, asked.body));
      const body = await readHouseRules(asked.db, member.brewery);
      return { body, version: body.version };
    },
  ),
];
