import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

import { Router } from 'express';
import helmet from 'helmet';

const swaggerUi = dirname(createRequire(import.meta.url).resolve('swagger-ui-dist/package.json'));
const FILES: Readonly<Record<string, string>> = {
  'docs.js': fileURLToPath(new URL('./page/docs.js', import.meta.url)),
  'swagger-ui.css': join(swaggerUi, 'swagger-ui.css'),
  'swagger-ui-bundle.js': join(swaggerUi, 'swagger-ui-bundle.js'),
};

/** The reader of descriptions styles its elements one by one, and knows no Trusted Types. */
export const docsPolicy = helmet.contentSecurityPolicy({
  useDefaults: false,
  directives: {
    'default-src': ["'none'"],
    'script-src': ["'self'"],
    'style-src': ["'self'", "'unsafe-inline'"],
    'img-src': ["'self'", 'data:'],
    'connect-src': ["'self'"],
    'base-uri': ["'none'"],
    'form-action': ["'none'"],
    'frame-ancestors': ["'none'"],
  },
});

/** What the page at `/api/docs` loads. */
export function docsFiles(): Router {
  const router = Router();
  for (const [name, path] of Object.entries(FILES)) {
    router.get(`/api/docs/${name}`, (_request, response) => response.sendFile(path));
  }
  return router;
}
