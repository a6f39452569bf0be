import compression from 'compression';
import express, { type Express } from 'express';
import helmet from 'helmet';
import { existsSync } from 'node:fs';
import type { ServerResponse } from 'node:http';
import { resolve } from 'node:path';
import { pinoHttp } from 'pino-http';
import { accountRoutes } from './accounts/account-routes';
import { auditRoutes } from './audit/audit-routes';
import { benchRoutes } from './benches/bench-routes';
import { buildRoutes } from './builds/build-routes';
import type { Context } from './context';
import { digestRoutes, unsubscribeRoutes } from './digests/digest-routes';
import { dropRoutes } from './drops/drop-routes';
import { guardCrossSite } from './http/cross-site';
import { handleErrors } from './http/handle-errors';
import { healthRoutes } from './http/health-routes';
import { identify } from './http/identify';
import { loggableUrl } from './http/loggable-url';
import { openapiRoutes } from './http/openapi-routes';
import { judgingRoutes } from './judging/judging-routes';
import { limitRoutes } from './limits/limit-routes';
import { mailboxRoutes } from './mail/mailbox-routes';
import { marginRoutes } from './margins/margin-routes';
import { productRoutes } from './products/product-routes';
import { runRoutes } from './queue/run-routes';
import { ServiceError } from './service-error';
import { importRoutes } from './sweeps/import-routes';
import { sweepRoutes } from './sweeps/sweep-routes';
import { installationRoutes } from './teams/installation-routes';
import { teamRoutes } from './teams/team-routes';
import { tokenRoutes } from './tokens/token-routes';

/** Every feature's routes, below /api. */
const FEATURES = [
  accountRoutes,
  teamRoutes,
  installationRoutes,
  tokenRoutes,
  auditRoutes,
  benchRoutes,
  sweepRoutes,
  importRoutes,
  productRoutes,
  buildRoutes,
  marginRoutes,
  judgingRoutes,
  runRoutes,
  dropRoutes,
  limitRoutes,
  digestRoutes,
  mailboxRoutes,
  openapiRoutes,
];

/** Builds the web application without listening. */
export function createApp(context: Context): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', context.config.trustedProxies);
  app.use(
    pinoHttp({
      logger: context.log,
      autoLogging: { ignore: (request) => !request.url?.startsWith('/api/') },
      serializers: { req: describeRequest, res: describeResponse },
    }),
  );
  app.use(
    helmet({
      contentSecurityPolicy: { directives: contentPolicy() },
      strictTransportSecurity: context.config.isProduction,
    }),
  );
  app.use(
    compression({
      threshold: SMALL_ANSWER_BYTES,
      filter: (request, response) =>
        isText(response.getHeader('content-type')) && compression.filter(request, response),
    }),
  );

  app.use('/api', keepToTheCaller, healthRoutes(context), unsubscribeRoutes(context), express.json({ limit: '256kb' }));
  app.use('/api', identify(context), guardCrossSite);
  for (const routes of FEATURES) app.use('/api', routes(context));
  app.use('/api', (request) => {
    throw new ServiceError('notFound', `there is no ${request.method} ${request.originalUrl}`);
  });

  servePages(app);
  app.use(handleErrors(context.log));
  return app;
}

/** What the log says of a request: no header, query or path that may hold a secret. */
function describeRequest({ id, method, url }: { id: unknown; method: string; url: string }) {
  return { id, method, url: loggableUrl(url) };
}

function describeResponse({ statusCode }: { statusCode: number }) {
  return { statusCode };
}

/** Answers differ from caller to caller and moment to moment: nobody in between keeps them, and the browser asks again. */
const keepToTheCaller: express.RequestHandler = (_request, response, next) => {
  response.set('cache-control', 'private, no-cache');
  next();
};

/** No inline script anywhere; styles inline because Angular writes component styles into the page. */
function contentPolicy(): Record<string, string[] | null> {
  return {
    'default-src': ["'self'"],
    'script-src': ["'self'"],
    'script-src-attr': ["'none'"],
    'style-src': ["'self'", "'unsafe-inline'"],
    'img-src': ["'self'", 'data:', 'blob:'],
    'font-src': ["'self'"],
    'connect-src': ["'self'"],
    'frame-ancestors': ["'none'"],
    'object-src': ["'none'"],
    // Without TLS in front, as on a bench's own network, this would turn every address into one that does not answer.
    'upgrade-insecure-requests': null,
  };
}

/** An answer up to this fits into the first packets of a connection; a compressor for it costs more than the answer. */
const SMALL_ANSWER_BYTES = 8 * 1024;

/** Level traces do not shrink under gzip and cost a hundred times their reading. */
function isText(contentType: unknown): boolean {
  return contentType !== 'application/octet-stream';
}

function servePages(app: Express): void {
  const client = resolve('dist/client');
  const index = resolve(client, 'index.html');
  app.use(express.static(client, { index: false, cacheControl: false, setHeaders: keepHashedFiles }));
  app.get('/{*path}', (_request, response, next) => {
    if (!existsSync(index)) {
      next(new ServiceError('notFound', 'the pages are not built yet: run npm run build'));
      return;
    }
    response.set('cache-control', 'no-cache').sendFile(index);
  });
}

/** A file with a hash in its name never changes; any other is asked for again. */
function keepHashedFiles(response: ServerResponse, path: string): void {
  const isHashed = /-[A-Z0-9]{8}\.[a-z0-9]+$/.test(path);
  response.setHeader('cache-control', isHashed ? 'public, max-age=31536000, immutable' : 'no-cache');
}
