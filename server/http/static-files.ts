import { existsSync } from 'node:fs';
import { join } from 'node:path';
import compression from 'compression';
import express, { type Express, type Response } from 'express';
import { AppError } from '../../shared/errors.ts';

const yearSeconds = 31_536_000;

function cacheFor(response: Response, path: string): void {
  // Vite names everything in assets/ after its content.
  const hashed = /[\\/]assets[\\/]/.test(path);
  response.setHeader('Cache-Control', hashed ? `public, max-age=${yearSeconds}, immutable` : 'no-cache');
}

/**
 * The built client: its files, and index.html for every page's address. A missing file is 404, not a page. Without a build
 * (API tests, or development behind the client's own server) there is nothing to serve.
 */
export function serveClient(app: Express, folder: string): void {
  const page = join(folder, 'index.html');
  if (!existsSync(page)) return;
  app.use(compression());
  app.use(express.static(folder, { index: false, redirect: false, setHeaders: cacheFor }));
  app.get('/{*path}', (request, response) => {
    if (/\.[a-z0-9]{2,5}$/i.test(request.path)) throw new AppError('not-found');
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page);
  });
}
