import { z } from 'zod';
import { api } from '#shared/api/urls.ts';
import { forAnyone } from '../../http/route.ts';
import type { Route } from '../../http/operation.ts';
import { openApiDocument } from '../../openapi.ts';

/** The document lists every route, itself included, so it is made from the others when first asked for. */
export function openApiRoute(others: readonly Route[]): Route {
  let document: ReturnType<typeof openApiDocument> | undefined;
  const route: Route = forAnyone(
    {
      name: 'openApi',
      method: 'get',
      path: api.openapi,
      summary: 'This document',
      answer: z.looseObject({ openapi: z.string() }),
      status: 200,
    },
    async () => {
      document ??= openApiDocument([route, ...others]);
      return { body: document };
    },
  );
  return route;
}
