import { readFileSync } from 'node:fs';
import path from 'node:path';
import type supertest from 'supertest';
import { someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

interface Schema {
  $ref?: string;
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
}

interface Operation {
  requestBody?: { content: Record<string, { schema: Schema }> };
}

interface Document {
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, Schema> };
}

/** The interface as it is published: it knows every body and every field, whoever adds one. */
const published = JSON.parse(readFileSync(path.join(__dirname, '../openapi.json'), 'utf8')) as Document;

interface Field {
  /** Where in the body, as a JSON pointer. */
  pointer: string;
  isNeeded: boolean;
  /** The smallest body that has the field, with this value in it. */
  bodyWith: (value: unknown) => unknown;
}

type Wrap = (inner: unknown) => unknown;

function fieldsOf(schema: Schema, parent = '#', wrap: Wrap = (inner) => inner): Field[] {
  const { properties = {}, required = [] } = resolved(schema);
  return Object.entries(properties).flatMap(([name, property]) => {
    const pointer = `${parent}/${name}`;
    const isNeeded = required.includes(name);
    const own = { pointer, isNeeded, bodyWith: (value: unknown) => wrap({ [name]: value }) };
    const inside = property.items
      ? fieldsOf(property.items, `${pointer}/0`, (inner) => wrap({ [name]: [inner] }))
      : fieldsOf(property, pointer, (inner) => wrap({ [name]: inner }));
    return [own, ...inside];
  });
}

function resolved({ $ref, ...schema }: Schema): Schema {
  return $ref ? (published.components.schemas[$ref.split('/').at(-1) ?? ''] ?? {}) : schema;
}

const ANY_ID = '4f0f5b52-1d9c-4c6e-9a35-0d7f9c1a2b3c';

const bodies = Object.entries(published.paths).flatMap(([route, methods]) =>
  Object.entries(methods).flatMap(([method, { requestBody }]) => {
    const schema = requestBody?.content['application/json']?.schema;
    return schema ? [{ name: `${method} ${route}`, method, route, fields: fieldsOf(schema) }] : [];
  }),
);

describe('a field that is not there', () => {
  let test: TestApp;
  let everybody: supertest.Agent;

  beforeAll(async () => {
    test = await startTestApp();
    ({ agent: everybody } = await someoneWith(test, 'mentor', 'steward', 'treasurer', 'organiser'));
  });
  afterAll(() => test.close());

  const send = (method: string, route: string, body: unknown) => {
    const address = route.replaceAll(/\{[^}]+\}/g, ANY_ID);
    return everybody[method as 'post' | 'put' | 'patch'](address).send(body as object);
  };
  const detailAt = (body: unknown, pointer: string): string | undefined =>
    (body as { errors?: { pointer: string; detail: string }[] }).errors?.find(
      (error) => error.pointer === pointer,
    )?.detail;

  it('finds the bodies and their nested fields at all', () => {
    const fields = bodies.flatMap(({ name, fields: own }) => own.map(({ pointer }) => `${name} ${pointer}`));
    expect(fields).toEqual(
      expect.arrayContaining([
        'post /api/auth/sign-in #/sharedDevice',
        'post /api/build-nights #/instead/0/benchIds',
        'post /api/reconciliation/lines/{lineId}/match #/note',
      ]),
    );
  });

  it.each(bodies)('is refused by name when it is null: $name', async ({ method, route, fields }) => {
    for (const { pointer, isNeeded, bodyWith } of fields) {
      const { status, body } = await send(method, route, bodyWith(null));
      const name = pointer.split('/').at(-1) ?? '';
      const words = isNeeded ? `${name} is needed.` : `${name} may be left out, but not be null.`;
      expect({ pointer, status, detail: detailAt(body, pointer) }).toEqual({
        pointer,
        status: 422,
        detail: words,
      });
    }
  });

  it.each(bodies)('is asked for by name when it is missing: $name', async ({ method, route, fields }) => {
    const needed = fields.filter(({ pointer, isNeeded }) => isNeeded && pointer.split('/').length === 2);
    if (needed.length === 0) return;
    const { body } = await send(method, route, {}).expect(422);
    for (const { pointer } of needed)
      expect(detailAt(body, pointer)).toBe(`${pointer.split('/').at(-1)} is needed.`);
  });
});
