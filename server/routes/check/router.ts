import { checkChainAnswer, checkChainRequest } from '#shared/api/check.ts';
import { checkPourAnswer, checkPourRequest } from '#shared/api/checkPour.ts';
import { api } from '#shared/api/urls.ts';
import { checkChain } from '#shared/chain/checkChain.ts';
import { checkPourRequested } from '#shared/pour/wire.ts';
import { forSignedIn } from '../../http/route.ts';

export const checkRoutes = [
  forSignedIn(
    {
      name: 'checkChain',
      method: 'post',
      path: api.checkChain,
      summary: 'The engine’s answer for a chain of batches; nothing is stored',
      body: checkChainRequest,
      answer: checkChainAnswer,
      status: 200,
      problems: ['too-many'],
    },
    async ({ body, tries }, { person }) => {
      await tries.count('checksByPerson', person.id);
      return { body: checkChain(body) };
    },
  ),
  forSignedIn(
    {
      name: 'checkPour',
      method: 'post',
      path: api.checkPour,
      summary: 'May the wort go onto the cake, and when; nothing is stored',
      body: checkPourRequest,
      answer: checkPourAnswer,
      status: 200,
      problems: ['too-many'],
    },
    async ({ body, tries }, { person }) => {
      await tries.count('checksByPerson', person.id);
      return { body: checkPourRequested(body) };
    },
  ),
];
