import { provideHttpClient, withInterceptors, HttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { type GuardResult, type MaybeAsync, provideRouter, Router } from '@angular/router';

import { Session } from './session';
import { sessionInterceptor } from './session-interceptor';
import { signedInGuard } from './signed-in-guard';

const membership = { id: 1, name: 'Own', role: 'admin' };
const ada = {
  id: 7,
  email: 'ada@example.org',
  name: 'Ada',
  workshop: membership,
  workshops: [membership],
};
const unauthorised = { status: 401, statusText: 'Unauthorized' };

function arrange() {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([sessionInterceptor])),
      provideHttpClientTesting(),
      provideRouter([]),
    ],
  });
  return { session: TestBed.inject(Session), calls: TestBed.inject(HttpTestingController) };
}

describe('the session', () => {
  it('asks the server once who is signed in', async () => {
    const { session, calls } = arrange();

    const both = Promise.all([session.ready(), session.ready()]);
    calls.expectOne('/api/session').flush(ada);
    await both;

    expect(session.user()).toEqual(ada);
  });

  it('takes a refusal for a visitor', async () => {
    const { session, calls } = arrange();

    const ready = session.ready();
    calls.expectOne('/api/session').flush(null, unauthorised);
    await ready;

    expect(session.isSignedIn()).toBe(false);
  });

  it('asks again after the server could not be reached', async () => {
    const { session, calls } = arrange();

    const ready = session.ready();
    calls.expectOne('/api/session').flush(null, { status: 500, statusText: 'Fault' });
    await expect(ready).rejects.toBeDefined();
    const again = session.ready();
    calls.expectOne('/api/session').flush(ada);
    await again;

    expect(session.isSignedIn()).toBe(true);
  });

  it('keeps the user and says so when the server ends it in mid-work', async () => {
    const { session, calls } = arrange();
    const signedIn = session.signIn({ email: 'ada@example.org', password: 'correct horse' });
    calls.expectOne('/api/session').flush(ada);
    await signedIn;

    TestBed.inject(HttpClient)
      .put('/api/receivers/1', {})
      .subscribe({ error: () => undefined });
    calls.expectOne('/api/receivers/1').flush(null, unauthorised);

    expect(session.hasLapsed()).toBe(true);
    expect(session.user()).toEqual(ada);
  });

  it('goes on after signing in again', async () => {
    const { session, calls } = arrange();
    const first = session.signIn({ email: 'ada@example.org', password: 'correct horse' });
    calls.expectOne('/api/session').flush(ada);
    await first;
    session.lapse();

    const second = session.signIn({ email: 'ada@example.org', password: 'correct horse' });
    calls.expectOne('/api/session').flush(ada);
    await second;

    expect(session.hasLapsed()).toBe(false);
  });
});

describe('the signed-in guard', () => {
  const enter = (url: string): MaybeAsync<GuardResult> =>
    TestBed.runInInjectionContext(() => signedInGuard({} as never, { url } as never));

  it('lets in who is signed in', async () => {
    const { calls } = arrange();

    const entered = enter('/sites');
    calls.expectOne('/api/session').flush(ada);

    expect(await entered).toBe(true);
  });

  it('sends a visitor to sign in, and remembers the address', async () => {
    const { calls } = arrange();

    const entered = enter('/receivers/3?if=455000');
    calls.expectOne('/api/session').flush(null, unauthorised);

    expect(await entered).toEqual(
      TestBed.inject(Router).parseUrl('/sign-in?next=%2Freceivers%2F3%3Fif%3D455000'),
    );
  });
});
