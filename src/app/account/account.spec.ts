import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { OWN_MACHINE } from '../core/own-machine';
import { AccountHarness } from './account-harness';
import { accountRoutes } from './account.routes';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Elsewhere {}

const membership = { id: 1, name: 'Own', role: 'admin' };
const ada = {
  id: 7,
  email: 'ada@example.org',
  name: 'Ada',
  workshop: membership,
  workshops: [membership],
};
const problem = (status: number, title: string, issues?: object[]) => ({
  type: 'x',
  title,
  status,
  instance: 'a1',
  issues,
});

async function arrange(address: string) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      { provide: OWN_MACHINE, useValue: false },
      provideRouter(
        [...accountRoutes, { path: '**', component: Elsewhere }],
        withComponentInputBinding(),
      ),
    ],
  });
  const page = await RouterTestingHarness.create();
  await page.navigateByUrl(address);
  const loader = TestbedHarnessEnvironment.documentRootLoader(page.fixture);
  return {
    calls: TestBed.inject(HttpTestingController),
    form: await loader.getHarness(AccountHarness),
    router: TestBed.inject(Router),
  };
}

describe('signing in', () => {
  it('leads to the address that was asked for', async () => {
    const { calls, form, router } = await arrange('/sign-in?next=%2Fsites%2F4');

    await form.fill('E-mail', 'Ada@Example.org');
    await form.fill('Password', ' correct horse ');
    await form.press('Sign in');
    const call = calls.expectOne({ url: '/api/session', method: 'POST' });
    call.flush(ada);

    expect(call.request.body).toEqual({ email: 'ada@example.org', password: ' correct horse ' });
    await vi.waitFor(() => {
      expect(router.url).toBe('/sites/4');
    });
  });

  it('asks the server nothing while something is missing', async () => {
    const { calls, form } = await arrange('/sign-in');

    await form.press('Sign in');

    calls.verify();
    expect(await form.messages()).toEqual(['Give your e-mail address.', 'Give your password.']);
  });

  it('says what the server says, and keeps what was typed', async () => {
    const { calls, form } = await arrange('/sign-in');
    await form.fill('E-mail', 'ada@example.org');
    await form.fill('Password', 'wrong');

    await form.press('Sign in');
    const refusal = problem(401, 'E-mail or password is not right.');
    calls.expectOne('/api/session').flush(refusal, { status: 401, statusText: 'Unauthorized' });

    await vi.waitFor(async () => {
      expect(await form.messages()).toEqual(['E-mail or password is not right.']);
    });
  });

  it('shows the password on request', async () => {
    const { form } = await arrange('/sign-in');

    expect(await form.typeOf('Password')).toBe('password');
    await form.press('Show');
    expect(await form.typeOf('Password')).toBe('text');
  });
});

describe('registering', () => {
  it('makes an account and goes on', async () => {
    const { calls, form, router } = await arrange('/register?next=%2Freceivers%2Fnew');

    await form.fill('Name', 'Ada');
    await form.fill('E-mail', 'ada@example.org');
    await form.fill('Password', 'correct horse');
    await form.press('Register');
    calls.expectOne({ url: '/api/accounts', method: 'POST' }).flush(ada);

    await vi.waitFor(() => {
      expect(router.url).toBe('/receivers/new');
    });
  });

  it('refuses a short password in the words of the contract', async () => {
    const { form } = await arrange('/register');
    await form.fill('Name', 'Ada');
    await form.fill('E-mail', 'ada.example.org');
    await form.fill('Password', 'short');

    await form.press('Register');

    expect(await form.messages()).toEqual([
      'Give an e-mail address such as name@example.org.',
      'Give a password of at least 8 characters; 12 or more are better.',
    ]);
  });

  it('puts what the server objects to on its field', async () => {
    const { calls, form } = await arrange('/register');
    await form.fill('Name', 'Ada');
    await form.fill('E-mail', 'ada@example.org');
    await form.fill('Password', 'password1234');

    await form.press('Register');
    const issues = [{ path: 'password', message: 'This password is too common.' }];
    const refusal = problem(400, 'Some fields are not right.', issues);
    calls.expectOne('/api/accounts').flush(refusal, { status: 400, statusText: 'Bad' });

    await vi.waitFor(async () => {
      expect(await form.messages()).toEqual(['This password is too common.']);
    });
  });
});
