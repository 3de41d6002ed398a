/** Requests that cannot be taken, made from an operation's own JSON schema. */

export interface JsonSchema {
  type?: string | string[];
  properties?: Record<string, JsonSchema>;
  items?: JsonSchema;
  enum?: unknown[];
  const?: unknown;
  anyOf?: JsonSchema[];
  oneOf?: JsonSchema[];
  allOf?: JsonSchema[];
  required?: string[];
  minimum?: number;
  format?: string;
  pattern?: string;
  minLength?: number;
}

/** Bodies that are no JSON, or JSON of the wrong kind, whatever the operation. */
export const BROKEN_BODIES: readonly string[] = [
  '',
  '{',
  '{"a":}',
  'null',
  '[]',
  '0',
  '"text"',
  'true',
  '[{}]',
  '{"__proto__":{"x":1}}',
  '{"constructor":null}',
  '{"unknown":1}',
  '\u0000',
  '{"a":"\\u0000"}',
  '{"a":"\\ud800"}',
  '{"a":1e999}',
  `{"a":${'['.repeat(500)}${']'.repeat(500)}}`,
  `{"a":"${'x'.repeat(300_000)}"}`,
];

/** Values that hardly any field takes. */
export const ODD_VALUES: readonly unknown[] = [
  null,
  true,
  -1e308,
  1.5,
  '',
  'NaN',
  '\u0000',
  '\ud800',
  '0000-00-00',
  '2027-02-30',
  "'; drop table batch; --",
  'x'.repeat(5000),
  [],
  [[]],
  {},
  { toString: 'x' },
];

/** A body that the schema takes, as plain as may be. */
export function example(schema: JsonSchema): unknown {
  if (schema.const !== undefined) return schema.const;
  if (schema.enum) return schema.enum[0];
  const [first] = schema.anyOf ?? schema.oneOf ?? [];
  if (first) return example(first);
  const types = [schema.type ?? 'object'].flat();
  if (types.includes('null')) return null;
  switch (types[0]) {
    case 'string':
      return exampleText(schema);
    case 'number':
    case 'integer':
      return schema.minimum ?? 1;
    case 'boolean':
      return false;
    case 'array':
      return [];
    default:
      return Object.fromEntries(
        Object.entries(schema.properties ?? {}).map(([key, field]) => [key, example(field)]),
      );
  }
}

function exampleText({ format, pattern, minLength = 1 }: JsonSchema): string {
  if (format === 'uuid') return 'c0ffee00-0000-4000-8000-000000000000';
  if (format === 'email') return 'mo@saltmarsh.example';
  if (pattern?.includes('19|20|21')) return '2027-03-06';
  return 'x'.repeat(Math.max(minLength, 3));
}

/** The example with one field changed to each odd value, one field after the other. */
export function* mutations(schema: JsonSchema): Generator<unknown> {
  const good = example(schema);
  if (typeof good !== 'object' || good === null) return;
  for (const [at, key] of Object.keys(good).entries()) {
    // Not each value for each field: every third, from another start, so that all meet all kinds.
    for (let odd = at % 3; odd < ODD_VALUES.length; odd += 3)
      yield { ...good, [key]: ODD_VALUES[odd] };
    yield Object.fromEntries(Object.entries(good).filter(([other]) => other !== key));
  }
}
