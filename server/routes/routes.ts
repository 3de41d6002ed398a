import type { Route } from '../http/operation.ts';
import { accountRoutes } from './account/router.ts';
import { boardRoutes } from './board/router.ts';
import { sessionRoutes } from './session/router.ts';
import { systemRoutes } from './system/router.ts';

/** Every operation of the API. */
export const routes: readonly Route[] = [
  ...systemRoutes,
  ...sessionRoutes,
  ...accountRoutes,
  ...boardRoutes,
];
