import { randomBytes } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';

import express, { type RequestHandler, Router } from 'express';

import { UnavailableError, UnknownPathError } from './errors.ts';
import { pagePolicy } from './security-headers.ts';

const HASHED = /-[A-Z0-9]{8}\.\w+$/;

interface ClientSettings {
  readonly CLIENT_DIR: string;
  readonly BEHIND_TLS: boolean;
}

/** Serves the built client; every address that is no file is a page of it. */
export function client(settings: ClientSettings): Router {
  const folder = resolve(settings.CLIENT_DIR);
  const router = Router();
  const servePage = page(join(folder, 'index.html'), settings.BEHIND_TLS);
  router.get('/index.html', servePage); // Before the files: as a file it would lack its nonce.
  router.use(
    express.static(folder, {
      index: false,
      redirect: false,
      setHeaders: (response, path) => {
        const age = HASHED.test(path) ? 'public, max-age=31536000, immutable' : 'no-cache';
        response.setHeader('Cache-Control', age);
      },
    }),
  );
  router.get('/{*path}', servePage);
  return router;
}

/** Addresses of pages have no dot in their last part. */
const isFile = (path: string): boolean => path !== '/index.html' && /\.[^/]*$/.test(path);

function page(file: string, isBehindTls: boolean): RequestHandler {
  return async (request, response, next) => {
    if (isFile(request.path)) throw new UnknownPathError();
    const html = await readFile(file, 'utf8').catch(() => {
      throw new UnavailableError('The pages have not been built yet.');
    });
    const nonce = randomBytes(16).toString('base64');
    pagePolicy(nonce, isBehindTls)(request, response, (error) => {
      if (error) {
        next(error);
        return;
      }
      response.set('Cache-Control', 'no-store').type('html');
      response.send(html.replace('<app-root', `<app-root ngCspNonce="${nonce}"`));
    });
  };
}
