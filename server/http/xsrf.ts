import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';

import { parseCookie } from 'cookie';
import type { Request, RequestHandler } from 'express';

import { ForbiddenError } from './errors.ts';

const COOKIE = 'XSRF-TOKEN';
const HEADER = 'X-XSRF-TOKEN';
const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

interface XsrfSettings {
  readonly SESSION_SECRET: string;
  readonly BEHIND_TLS: boolean;
}

/**
 * Keeps other pages from changing things in a user's name: reading hands out a signed token in a
 * cookie, changing must send it back in a header and come from our own pages.
 */
export function xsrf({ SESSION_SECRET, BEHIND_TLS }: XsrfSettings): RequestHandler {
  const sign = (nonce: string): string =>
    `${nonce}.${createHmac('sha256', SESSION_SECRET).update(`xsrf ${nonce}`).digest('base64url')}`;
  const isOurs = (token: string): boolean => isSame(token, sign(token.split('.')[0] ?? ''));

  return (request, response, next) => {
    const token = parseCookie(request.headers.cookie ?? '')[COOKIE] ?? '';
    if (READING.has(request.method)) {
      if (!isOurs(token)) {
        const fresh = sign(randomBytes(16).toString('base64url'));
        response.cookie(COOKIE, fresh, { path: '/', sameSite: 'lax', secure: BEHIND_TLS });
      }
      next();
      return;
    }
    refuseForeign(request);
    if (!isOurs(token) || !isSame(token, request.get(HEADER) ?? '')) {
      throw new ForbiddenError(
        `Read any address under /api first, then send its ${COOKIE} cookie back in ${HEADER}.`,
        'xsrf-token-invalid',
      );
    }
    next();
  };
}

function refuseForeign(request: Request): void {
  const origin = request.get('Origin');
  const fetchSite = request.get('Sec-Fetch-Site');
  const isForeign =
    (origin !== undefined && hostOf(origin) !== request.host) ||
    (fetchSite !== undefined && fetchSite !== 'same-origin');
  if (isForeign) throw new ForbiddenError('This request comes from another site.', 'cross-site');
}

const hostOf = (origin: string): string | undefined =>
  URL.canParse(origin) ? new URL(origin).host : undefined;

function isSame(a: string, b: string): boolean {
  const [left, right] = [Buffer.from(a), Buffer.from(b)];
  return left.length === right.length && timingSafeEqual(left, right);
}
