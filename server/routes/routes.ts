import type { Route } from '../http/operation.ts';
import { closingRoutes } from './account/closingRouter.ts';
import { accountRoutes } from './account/router.ts';
import { secretRoutes } from './account/secretsRouter.ts';
import { batchRoutes } from './batches/router.ts';
import { batchRecordRoutes } from './batch-record/router.ts';
import { boardRoutes } from './board/router.ts';
import { breweryRoutes } from './brewery/router.ts';
import { chainRoutes } from './chains/router.ts';
import { checkRoutes } from './check/router.ts';
import { commentRoutes } from './comments/router.ts';
import { houseRulesRoutes } from './house-rules/router.ts';
import { joinRoutes } from './join/router.ts';
import { guestRoutes } from './guests/router.ts';
import { liveRoutes } from './live/router.ts';
import { moveRoutes } from './moves/router.ts';
import { membershipRoutes } from './people/membersRouter.ts';
import { peopleRoutes } from './people/router.ts';
import { recordRoutes } from './record/router.ts';
import { seasonRoutes } from './season/router.ts';
import { sessionRoutes } from './session/router.ts';
import { signInRoutes } from './sign-ins/router.ts';
import { pourRoutes } from './pour/router.ts';
import { openApiRoute } from './system/openapi.ts';
import { shareRoutes } from './share/router.ts';
import { systemRoutes } from './system/router.ts';
import { todayRoutes } from './today/router.ts';
import { vesselRoutes } from './vessels/router.ts';
import { yeastRoutes } from './yeasts/router.ts';

const resources: readonly Route[] = [
  ...systemRoutes,
  ...sessionRoutes,
  ...accountRoutes,
  ...secretRoutes,
  ...closingRoutes,
  ...signInRoutes,
  ...joinRoutes,
  ...breweryRoutes,
  ...peopleRoutes,
  ...membershipRoutes,
  ...boardRoutes,
  ...todayRoutes,
  ...seasonRoutes,
  ...recordRoutes,
  ...houseRulesRoutes,
  ...yeastRoutes,
  ...vesselRoutes,
  ...chainRoutes,
  ...commentRoutes,
  ...batchRoutes,
  ...batchRecordRoutes,
  ...pourRoutes,
  ...moveRoutes,
  ...liveRoutes,
  ...shareRoutes,
  ...guestRoutes,
  ...checkRoutes,
];

/** Every operation of the API. */
export const routes: readonly Route[] = [openApiRoute(resources), ...resources];
