import { existsSync } from 'node:fs';
import type { Server } from 'node:http';
import { join } from 'node:path';
import express, { type Express } from 'express';

/** Puts the client on the app, after every route of the API. */
export type ServeClient = (app: Express, server: Server) => Promise<void>;

/** The built client: hashed assets for ever, everything else fresh, and index.html for every page's address. */
export const serveBuiltClient = (folder: string): ServeClient => {
  if (!existsSync(join(folder, 'index.html')))
    throw new Error(`there is no built client in ${folder}: run "npm run build" first`);
  return async (app) => {
    // No fall-through: a missing chunk must be a 404, not a page.
    app.use(
      '/assets',
      express.static(join(folder, 'assets'), { fallthrough: false, immutable: true, maxAge: '1y', index: false }),
    );
    app.use(express.static(folder, { index: false, maxAge: 0 }));
    app.get('/{*path}', (_req, res) => {
      res.setHeader('Cache-Control', 'no-cache');
      res.sendFile(join(folder, 'index.html'));
    });
  };
};

/** The client from its sources, for development; changes show at once. */
export const serveClientSources =
  (root: string): ServeClient =>
  async (app, server) => {
    const { createServer } = await import('vite');
    const vite = await createServer({ root, server: { middlewareMode: true, hmr: { server } }, appType: 'spa' });
    server.on('close', () => void vite.close());
    app.use(vite.middlewares);
  };
