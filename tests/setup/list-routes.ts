import type { Express } from 'express';

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Record<string, boolean> };
  readonly handle: { readonly stack?: readonly Layer[] };
}

const walk = (layers: readonly Layer[], prefix: string): string[] =>
  layers.flatMap(({ route, handle }) => {
    if (route) return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${prefix}${route.path}`);
    return handle.stack ? walk(handle.stack, '/api') : [];
  });

/** Every route that the app answers, as 'GET /api/jobs/:jobId'. Routers are mounted under /api, all of them. */
export const listRoutes = (app: Express): string[] =>
  walk((app.router as unknown as { stack: readonly Layer[] }).stack, '').sort();
