import express, { Router } from 'express';
import { createRequire } from 'node:module';
import { dirname, resolve } from 'node:path';
import type { Context } from '../context';
import { buildDocument } from './openapi/build-document';

const READER = resolve('server/http/openapi/reader');
const SWAGGER_UI = dirname(createRequire(resolve('package.json')).resolve('swagger-ui-dist/package.json'));

/** The OpenAPI document and a page to read it, without a sign-in and without the network. */
export function openapiRoutes(_context: Context): Router {
  let document: ReturnType<typeof buildDocument> | undefined;
  const routes = Router()
    .get('/openapi.json', (_request, response) => {
      response.json((document ??= buildDocument()));
    })
    .get('/docs', (_request, response) => {
      response.sendFile('index.html', { root: READER });
    })
    .get('/docs/show-interface.js', (_request, response) => {
      response.sendFile('show-interface.js', { root: READER });
    });
  for (const file of ['swagger-ui.css', 'swagger-ui-bundle.js'])
    routes.use(`/docs/${file}`, express.static(resolve(SWAGGER_UI, file), { maxAge: '1d' }));
  return routes;
}
