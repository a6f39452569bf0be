import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { createTestContext, type TestContext } from '../support/test-context';

interface Layer {
  route?: { path: string; stack: { method: string }[] };
  handle: { stack?: Layer[] };
}
interface Operation {
  security: Record<string, string[]>[];
  parameters?: { name: string; required: boolean; schema: Record<string, unknown> }[];
  requestBody?: { content: Record<string, { schema: { required?: string[] } }> };
  responses: Record<string, { content?: Record<string, unknown> }>;
}

let context: TestContext;
let app: Express;
let document: { openapi: string; paths: Record<string, Record<string, Operation>>; components: Record<string, object> };

beforeAll(async () => {
  context = createTestContext();
  app = createApp(context);
  document = (await request(app).get('/api/openapi.json').expect(200)).body;
});
afterAll(() => context.close());

/** `get /v1/products/{}` for every route below /v1, names of parameters left out. */
function routesOf(layers: readonly Layer[]): string[] {
  return layers.flatMap(({ route, handle }) =>
    route === undefined
      ? routesOf(handle.stack ?? [])
      : route.stack.map(({ method }) => `${method} /api${route.path.replace(/:\w+/g, '{}')}`),
  );
}

describe('the OpenAPI document', () => {
  it('is OpenAPI 3.1 and tells of every call there is, and of no other', () => {
    expect(document.openapi).toBe('3.1.0');
    const told = Object.entries(document.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path.replace(/\{\w+\}/g, '{}')}`),
    );
    const served = new Set(
      routesOf(app.router.stack as unknown as Layer[]).filter((call) => call.includes(' /api/v1/')),
    );
    expect(told.sort()).toEqual([...served].sort());
  });

  it('tells of tags and file of an import, and what needs to be there', () => {
    const post = document.paths['/api/v1/sweeps']?.['post'];
    expect(post?.requestBody?.content['multipart/form-data']?.schema.required).toEqual(['file', 'tags']);
    expect(document.components['schemas']).toHaveProperty('SweepTags.required', [
      ...['product', 'hardware', 'firmware', 'state', 'bench', 'line', 'detector'],
    ]);
    expect(Object.keys(post?.responses ?? {})).toEqual(['200', '201', '400', '401', '403', '404', '413', '422']);
    expect(post?.responses['422']?.content).toHaveProperty(['application/problem+json', 'schema', '$ref']);
  });

  it('takes scopes from the table of permissions, and asks the pages for the cross-site token', () => {
    const securityOf = (path: string, method: string) => document.paths[path]?.[method]?.security;
    expect(securityOf('/api/v1/sweeps', 'post')).toEqual([{ token: ['sweeps:write'] }, { session: [], crossSite: [] }]);
    expect(securityOf('/api/v1/products/{key}/gate', 'get')).toEqual([{ token: ['gate:read'] }, { session: [] }]);
    expect(securityOf('/api/v1/products/{key}/reference', 'put')).toEqual([{ session: [], crossSite: [] }]);
  });

  it('lets no parameter of an address be null', () => {
    const parameters = Object.values(document.paths).flatMap((methods) =>
      Object.values(methods).flatMap(({ parameters = [] }) => parameters),
    );
    expect(parameters.length).toBeGreaterThan(30);
    expect(parameters.filter(({ schema }) => JSON.stringify(schema).includes('"null"'))).toEqual([]);
  });
});

describe('the page to read it', () => {
  it('loads everything from this server and holds no inline script', async () => {
    const page = await request(app).get('/api/docs').expect(200).expect('content-type', /html/);
    expect(page.headers['content-security-policy']).toContain("script-src 'self'");
    expect(page.text).not.toMatch(/<script(?![^>]* src=)/);
    const addresses = [...page.text.matchAll(/(?:src|href)="([^"]+)"/g)].map(([, address = '']) => address);
    expect(addresses.filter((address) => !address.startsWith('/'))).toEqual([]);
    for (const address of addresses.filter((one) => one.startsWith('/api/'))) {
      await request(app).get(address).expect(200);
    }
  });
});
