import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Policies by which Angular, its CDK and the client's worker mark what is their own as trusted. */
const TRUSTED_TYPES = ['angular', 'angular#bundler', 'angular#components', 'fallow#worker'];

/** Headers for every answer. Over plain http nothing may send browsers to https. */
export function securityHeaders({ BEHIND_TLS }: { readonly BEHIND_TLS: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: { useDefaults: false, directives: policy(["'self'"], BEHIND_TLS) },
    strictTransportSecurity: BEHIND_TLS,
    xFrameOptions: { action: 'deny' },
    referrerPolicy: { policy: 'same-origin' },
  });
}

/** For addresses that hold a secret: told to no other site, and kept out of search engines. */
export const secretAddress: RequestHandler = (_request, response, next) => {
  response.set({ 'Referrer-Policy': 'no-referrer', 'X-Robots-Tag': 'noindex, nofollow' });
  next();
};

/** The policy of the client's page: its styles carry the nonce. */
export function pagePolicy(nonce: string, isBehindTls: boolean): RequestHandler {
  return helmet.contentSecurityPolicy({
    useDefaults: false,
    directives: policy(["'self'", `'nonce-${nonce}'`], isBehindTls),
  });
}

function policy(styles: string[], isBehindTls: boolean): Record<string, string[]> {
  return {
    'default-src': ["'self'"],
    'script-src': ["'self'"],
    'worker-src': ["'self'"],
    'script-src-attr': ["'none'"],
    'style-src': styles,
    'img-src': ["'self'", 'data:'],
    'font-src': ["'self'"],
    'connect-src': ["'self'"],
    'object-src': ["'none'"],
    'base-uri': ["'self'"],
    'form-action': ["'self'"],
    'frame-ancestors': ["'none'"],
    'require-trusted-types-for': ["'script'"],
    'trusted-types': TRUSTED_TYPES,
    ...(isBehindTls && { 'upgrade-insecure-requests': [] }),
  };
}
