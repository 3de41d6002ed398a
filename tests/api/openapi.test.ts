import { Ajv2020 } from 'ajv/dist/2020.js';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { boardOf, good, shelve, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { Visitor } from '../support/visitor.ts';

interface Document {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, object> };
}
interface Operation {
  operationId: string;
  parameters?: { name: string; in: string }[];
  responses: Record<string, { content?: Record<string, { schema: object }> }>;
}

let server: TestServer;
let document: Document;

beforeAll(async () => {
  server = await startTestServer();
  document = await good<Document>(new Visitor(server.url).get(api.openapi));
});
afterAll(() => server.close());

const ajv = () => {
  const made = new Ajv2020({ strict: false, validateFormats: false });
  made.addSchema({ $id: 'doc', components: document.components });
  return made;
};

it('is OpenAPI 3.1, each operation named once', () => {
  expect(document.openapi).toBe('3.1.0');
  const names = operations().map(({ operationId }) => operationId);
  expect(new Set(names).size).toBe(names.length);
  expect(names.length).toBeGreaterThan(30);
});

it('declares each parameter of each path, and how each operation ends', () => {
  for (const [path, methods] of Object.entries(document.paths))
    for (const operation of Object.values(methods)) {
      const inPath = (operation.parameters ?? []).filter((each) => each.in === 'path');
      const named = Array.from(path.matchAll(/\{([a-z]+)\}/gi), ([, name]) => name);
      expect(inPath.map(({ name }) => name)).toEqual(named);
      expect(Object.keys(operation.responses).some((code) => code.startsWith('2'))).toBe(true);
      expect(operation.responses['500']).toBeDefined();
    }
});

it('holds only schemas that are valid JSON Schema 2020-12', () => {
  const checker = ajv();
  for (const { responses } of operations())
    for (const { content = {} } of Object.values(responses))
      for (const { schema } of Object.values(content))
        expect(checker.validateSchema(schema) || checker.errorsText()).toBe(true);
});

it('describes the board as it is answered', async () => {
  const season = await testSeason(server.url);
  await shelve(season, season.chainA, [{ name: 'A', brewOn: '2027-03-06' }, { name: 'B' }]);
  const operation = document.paths['/api/breweries/{brewery}/board']?.get;
  const schema = operation?.responses['200']?.content?.['application/json']?.schema;
  const validate = ajv().compile(schema ?? false);
  const board = await boardOf(season.head, season.slug);
  expect(validate(board) || validate.errors).toBe(true);
  expect(validate({ ...board, today: 'soon' })).toBe(false);
});

const operations = () => Object.values(document.paths).flatMap((methods) => Object.values(methods));
