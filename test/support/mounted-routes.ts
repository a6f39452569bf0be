import type { Express } from 'express';

interface Layer {
  name: string;
  rawPath?: string;
  route?: { path: string; methods: Record<string, boolean> };
  handle: { stack?: Layer[] };
}

/** Every route an application answers, as `GET /api/teams/:team`, and every folder of files it serves, as `FILES /`. */
export function mountedRoutes(app: Express): string[] {
  return routesBelow((app.router as unknown as { stack: Layer[] }).stack, '');
}

function routesBelow(layers: readonly Layer[], prefix: string): string[] {
  return layers.flatMap(({ name, rawPath = '/', route, handle }) => {
    if (route !== undefined) {
      return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${prefix}${route.path}`);
    }
    const place = rawPath === '/' ? prefix : prefix + rawPath;
    if (handle.stack !== undefined) return routesBelow(handle.stack, place);
    return name === 'serveStatic' ? [`FILES ${place || '/'}`] : [];
  });
}
