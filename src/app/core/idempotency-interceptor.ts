import type { HttpInterceptorFn } from '@angular/common/http';

/** Names each creating call, so that a repeated one creates nothing twice. */
export const idempotencyInterceptor: HttpInterceptorFn = (request, next) =>
  request.method === 'POST' && !request.headers.has('Idempotency-Key')
    ? next(request.clone({ setHeaders: { 'Idempotency-Key': newKey() } }))
    : next(request);

// crypto.randomUUID is missing on plain http outside this machine.
function newKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
