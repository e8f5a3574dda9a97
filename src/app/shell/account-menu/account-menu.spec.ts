import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { DOCUMENT } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatMenuHarness } from '@angular/material/menu/testing';
import { provideRouter } from '@angular/router';

import { Preferences } from '../../core/preferences';
import { Session } from '../../core/session/session';
import { AccountMenu } from './account-menu';

const own = { id: 1, name: 'Own', role: 'admin' };
const saltpan = { id: 2, name: 'Saltpan', role: 'librarian' };
const ada = {
  id: 7,
  email: 'ada@example.org',
  name: 'Ada',
  workshop: own,
  workshops: [own, saltpan],
};

async function arrange() {
  const assign = vi.fn();
  const page = new Proxy(document, {
    get: (target, key) => {
      if (key === 'location') return { assign };
      const value: unknown = Reflect.get(target, key);
      return typeof value === 'function' ? (value.bind(target) as unknown) : value;
    },
  });
  TestBed.configureTestingModule({
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
  });
  TestBed.overrideComponent(AccountMenu, {
    set: { providers: [{ provide: DOCUMENT, useValue: page }] },
  });
  const calls = TestBed.inject(HttpTestingController);
  const ready = TestBed.inject(Session).ready();
  calls.expectOne('/api/session').flush(ada);
  await ready;
  const loader = TestbedHarnessEnvironment.loader(TestBed.createComponent(AccountMenu));
  const menu = await loader.getHarness(MatMenuHarness);
  await menu.open();
  return { assign, calls, menu };
}

describe('the account’s menu', () => {
  it('names each workshop with the role there', async () => {
    const { menu } = await arrange();
    const texts = await Promise.all((await menu.getItems()).map((item) => item.getText()));

    expect(texts.slice(0, 2)).toEqual(['Own admin', 'Saltpan librarian']);
  });

  it('goes to another workshop, and begins there anew', async () => {
    const { assign, calls, menu } = await arrange();

    await menu.clickItem({ text: /Saltpan/u });
    const call = calls.expectOne({ url: '/api/session', method: 'PUT' });
    call.flush({ ...ada, workshop: saltpan });

    expect(call.request.body).toEqual({ workshopId: 2 });
    await vi.waitFor(() => {
      expect(assign).toHaveBeenCalledWith('/receivers');
    });
  });

  it('changes the light at once', async () => {
    const { menu } = await arrange();

    await menu.clickItem({ text: /Walnut/u });

    expect(TestBed.inject(Preferences).theme()).toBe('walnut');
  });

  it('signs out', async () => {
    const { assign, calls, menu } = await arrange();

    await menu.clickItem({ text: /Sign out/u });
    calls.expectOne({ url: '/api/session', method: 'DELETE' }).flush(null);

    await vi.waitFor(() => {
      expect(assign).toHaveBeenCalledWith('/');
    });
  });
});
