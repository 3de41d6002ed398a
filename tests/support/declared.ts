import { problemsOf } from '../../server/openapi.ts';
import { routes } from '../../server/routes/routes.ts';

/** What may be said of any request before it reaches its operation, and is not listed with each. */
const BEFORE_ALL = ['contract-ended', 'unreadable-body', 'too-large', 'not-json'] as const;

const pattern = (path: string) => new RegExp(`^${path.replace(/:[a-zA-Z]+/g, '[^/]+')}$`);
const known = routes.map((route) => ({
  method: route.operation.method.toUpperCase(),
  path: pattern(route.operation.path),
  name: route.operation.name,
  problems: new Set<string>([...problemsOf(route), ...BEFORE_ALL]),
}));

/** Throws where an operation answers with a problem that its document does not name. */
export function demandDeclared(method: string, address: string, body: unknown): void {
  const type: unknown = typeof body === 'object' && body !== null && Reflect.get(body, 'type');
  if (typeof type !== 'string' || !type.startsWith('/problems/')) return;
  const kind = type.slice('/problems/'.length);
  const [path = ''] = address.split('?');
  const operation = known.find((each) => each.method === method && each.path.test(path));
  if (operation && !operation.problems.has(kind))
    throw new Error(`${operation.name} answered ${kind}, which its document does not name`);
}
