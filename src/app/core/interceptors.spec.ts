import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';

import { idempotencyInterceptor } from './idempotency-interceptor';
import { retryInterceptor } from './retry-interceptor';

function arrange() {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([idempotencyInterceptor, retryInterceptor])),
      provideHttpClientTesting(),
    ],
  });
  return { http: TestBed.inject(HttpClient), calls: TestBed.inject(HttpTestingController) };
}

const unavailable = {
  status: 503,
  statusText: 'Service Unavailable',
  headers: { 'Retry-After': '2' },
};

describe('the idempotency interceptor', () => {
  it('names each creating call by a key of its own', () => {
    const { http, calls } = arrange();

    http.post('/api/receivers', {}).subscribe();
    http.post('/api/receivers', {}).subscribe();

    const keys = calls
      .match('/api/receivers')
      .map(({ request }) => request.headers.get('Idempotency-Key'));
    expect(keys[0]).toMatch(/^[0-9a-f]{32}$/u);
    expect(keys[1]).not.toBe(keys[0]);
  });

  it('leaves calls alone that create nothing', () => {
    const { http, calls } = arrange();

    http.put('/api/receivers/1', {}).subscribe();

    expect(calls.expectOne('/api/receivers/1').request.headers.has('Idempotency-Key')).toBe(false);
  });
});

describe('the retry interceptor', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it('asks again after the time the server named', () => {
    const { http, calls } = arrange();
    const answers: unknown[] = [];

    http.get('/api/sites').subscribe((answer) => answers.push(answer));
    calls.expectOne('/api/sites').flush(null, unavailable);
    vi.advanceTimersByTime(1999);
    calls.expectNone('/api/sites');
    vi.advanceTimersByTime(1);
    calls.expectOne('/api/sites').flush({ total: 0 });

    expect(answers).toEqual([{ total: 0 }]);
  });

  it('gives up after three more attempts', () => {
    const { http, calls } = arrange();
    const failed = vi.fn();

    http.get('/api/sites').subscribe({ error: failed });
    for (let attempt = 0; attempt < 4; attempt++) {
      calls.expectOne('/api/sites').flush(null, unavailable);
      vi.advanceTimersByTime(2000);
    }

    calls.expectNone('/api/sites');
    expect(failed).toHaveBeenCalledOnce();
  });

  it('repeats neither a change nor any other failure', () => {
    const { http, calls } = arrange();
    const failed = vi.fn();

    http.post('/api/sites', {}).subscribe({ error: failed });
    http.get('/api/sites/1').subscribe({ error: failed });
    calls.expectOne('/api/sites').flush(null, unavailable);
    calls.expectOne('/api/sites/1').flush(null, { status: 404, statusText: 'Not Found' });
    vi.advanceTimersByTime(20_000);

    calls.verify();
    expect(failed).toHaveBeenCalledTimes(2);
  });
});
