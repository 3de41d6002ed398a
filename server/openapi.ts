import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  extendZodWithOpenApi,
} from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { problem as problemContract, PROBLEMS, type ProblemKind } from '#shared/api/problem.ts';
import type { Route } from './http/operation.ts';

// Only schemas that are made from here on can bear a name in the document.
extendZodWithOpenApi(z);

const SESSION = 'session';

/** The API as OpenAPI 3.1, from the routes and the schemas that they themselves parse with. */
export function openApiDocument(routes: readonly Route[]) {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', SESSION, {
    type: 'apiKey',
    in: 'cookie',
    name: 'barmkin',
  });
  const problem = registry.register('Problem', z.object(problemContract.shape));
  for (const route of routes) {
    const { operation } = route;
    registry.registerPath({
      method: operation.method,
      path: templateOf(operation.path),
      operationId: operation.name,
      summary: operation.summary,
      security: route.who === 'anyone' ? [] : [{ [SESSION]: [] }],
      request: requestOf(route),
      responses: responsesOf(route, problem),
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: {
      title: 'Barmkin',
      version: '1',
      description:
        'A season’s brews as yeast-cake chains. Changes need JSON, and Sec-Fetch-Site: same-origin or an Origin of this server.',
    },
    servers: [{ url: '/' }],
  });
}

/** Express writes `:id`, OpenAPI `{id}`. */
export const templateOf = (path: string) => path.replace(/:([a-zA-Z]+)/g, '{$1}');

const namesIn = (path: string) =>
  Array.from(path.matchAll(/:([a-zA-Z]+)/g), ([, name = '']) => name);

/** Where an address names no season itself, one may stand behind it. */
const ofSeason = z.object({
  season: z
    .uuid()
    .optional()
    .openapi({ description: 'A season of the brewery; without it the current one' }),
});

function requestOf({ operation, who }: Route) {
  const { path, body, ifMatch } = operation;
  const takesSeason = who === 'member' && !path.includes(':season');
  const query = takesSeason ? ofSeason.extend(operation.query?.shape ?? {}) : operation.query;
  const names = namesIn(path);
  const params = z.object(
    Object.fromEntries(
      names.map((name) => [name, /^(id|season|[a-z]+Id)$/.test(name) ? z.uuid() : z.string()]),
    ),
  );
  return {
    ...(names.length > 0 && { params }),
    ...(query && { query }),
    ...(ifMatch && {
      headers: z.object({
        'If-Match': z.string().openapi({ description: 'ETag of the row that was changed' }),
      }),
    }),
    ...(body && { body: { required: true, content: { 'application/json': { schema: body } } } }),
  };
}

function responsesOf(route: Route, problem: z.ZodType) {
  const { answer, status, stream } = route.operation;
  const good = answer
    ? { description: 'Done', content: { 'application/json': { schema: answer } } }
    : stream
      ? { description: 'Stays open', content: { 'text/event-stream': { schema: z.string() } } }
      : { description: 'Done' };
  const failures = problemsOf(route);
  const statuses = [...new Set(failures.map((kind) => PROBLEMS[kind].status))];
  return {
    [status]: good,
    // A repeated create answers what is there.
    ...(status === 201 && { 200: { ...good, description: 'It had been made already' } }),
    ...Object.fromEntries(
      statuses.map((code) => [
        code,
        {
          description: failures
            .filter((kind) => PROBLEMS[kind].status === code)
            .map((kind) => `${kind}: ${PROBLEMS[kind].title}`)
            .join('; '),
          content: { 'application/problem+json': { schema: problem } },
        },
      ]),
    ),
  };
}

/** What can go wrong follows from what the operation asks for. */
export function problemsOf({ operation, who }: Route): ProblemKind[] {
  const { body, query, ifMatch, method, path, problems = [] } = operation;
  return [
    ...(who === 'anyone' ? [] : (['not-signed-in'] as const)),
    ...(who === 'member' ? (['not-allowed'] as const) : []),
    ...(path.includes(':') ? (['not-found'] as const) : []),
    ...(method === 'get' ? [] : (['cross-site'] as const)),
    ...(body ? (['invalid-request', 'unreadable-body', 'too-large', 'not-json'] as const) : []),
    ...(ifMatch ? (['version-missing', 'changed-since'] as const) : []),
    ...(query && !body ? (['invalid-request'] as const) : []),
    ...problems,
    'unexpected',
  ];
}
