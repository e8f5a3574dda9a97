import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatMenuHarness } from '@angular/material/menu/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { receiverDraft, type StoredReceiver } from '../../../../shared/contracts/receiver';
import { ReceiverList } from './receiver-list';
import { ReceiverListHarness } from './receiver-list-harness';
import { ReceiverListStore } from './receiver-list-store';

const stored = (id: number, name: string, editable = true): StoredReceiver => ({
  ...receiverDraft.parse({
    name,
    ifHz: 455_000,
    selectivity: { kind: 'widths', b6Hz: 8000, b60Hz: 45_000 },
    bands: [{ name: 'Medium wave', lowHz: 520_000, highHz: 1_610_000, oscillator: 'above' }],
  }),
  id,
  editable,
  ownerName: 'Ada',
  version: 1,
  createdAt: '2026-01-01T00:00:00Z',
  updatedAt: '2026-01-02T00:00:00Z',
});
const pageOf = (...items: StoredReceiver[]) => ({ items, total: items.length });

async function arrange(address = '/receivers') {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter(
        [{ path: 'receivers', component: ReceiverList, providers: [ReceiverListStore] }],
        withComponentInputBinding(),
      ),
    ],
  });
  const harness = await RouterTestingHarness.create();
  await harness.navigateByUrl(address);
  const calls = TestBed.inject(HttpTestingController);
  const loader = TestbedHarnessEnvironment.documentRootLoader(harness.fixture);
  const answer = async (body: object, options?: { status: number; statusText: string }) => {
    harness.detectChanges();
    calls
      .expectOne(({ url, method }) => url === '/api/receivers' && method === 'GET')
      .flush(body, options);
    await harness.fixture.whenStable();
  };
  return { calls, loader, answer, list: () => loader.getHarness(ReceiverListHarness) };
}

describe('the list of receivers', () => {
  it('shows each receiver with its IF and bands', async () => {
    const { answer, list } = await arrange();

    await answer(pageOf(stored(1, 'Kestrel'), stored(2, 'Harrow')));

    expect(await (await list()).names()).toEqual(['Kestrel', 'Harrow']);
    expect(await (await list()).text()).toContain('455\u00a0kHz');
    expect(await (await list()).text()).toContain('Medium wave');
  });

  it('says how to begin when there is none', async () => {
    const { answer, list } = await arrange();

    await answer(pageOf());

    expect(await (await list()).text()).toContain('No receiver is here yet');
    expect(await (await list()).text()).toContain('Set up the first one');
  });

  it('says what went wrong and tries again', async () => {
    const { answer, list, loader } = await arrange();
    const problem = { type: 'x', title: 'The database is away.', status: 500, instance: 'a1' };

    await answer(problem, { status: 500, statusText: 'Fault' });
    expect(await (await list()).alert()).toContain('The database is away.');
    const again = await loader.getHarness(MatButtonHarness.with({ text: 'Try again' }));
    const clicked = again.click();
    await vi.waitFor(() => answer(pageOf(stored(1, 'Kestrel'))));
    await clicked;

    expect(await (await list()).names()).toEqual(['Kestrel']);
  });

  it('asks for what the address says', async () => {
    const { calls } = await arrange('/receivers?search=kes&sort=updated&page=2');

    const { request } = calls.expectOne(({ url }) => url === '/api/receivers');

    expect(request.params.get('search')).toBe('kes');
    expect(request.params.get('sort')).toBe('updated');
    expect(request.params.get('page')).toBe('2');
  });

  it('puts the search into the address', async () => {
    const { answer, loader } = await arrange();
    await answer(pageOf(stored(1, 'Kestrel')));

    await (await loader.getHarness(MatInputHarness)).setValue('harrow');
    await vi.waitFor(() => {
      expect(TestBed.inject(Router).url).toBe('/receivers?search=harrow');
    });
  });

  it('deletes only after asking', async () => {
    const { answer, calls, list, loader } = await arrange();
    await answer(pageOf(stored(1, 'Kestrel')));

    const menu = await loader.getHarness(MatMenuHarness);
    await menu.open();
    await menu.clickItem({ text: 'Delete' });
    const dialog = await loader.getHarness(MatDialogHarness);
    expect(await dialog.getTitleText()).toBe('Delete “Kestrel”?');
    await (await dialog.getHarness(MatButtonHarness.with({ text: 'Delete it' }))).click();
    await vi.waitFor(() => {
      calls.expectOne({ url: '/api/receivers/1', method: 'DELETE' }).flush(null);
    });
    await vi.waitFor(() => answer(pageOf()));

    expect(await (await list()).status()).toBe('“Kestrel” is deleted.');
  });

  it('copies a receiver under another name', async () => {
    const { answer, calls, loader } = await arrange();
    await answer(pageOf(stored(1, 'Kestrel', false)));

    const menu = await loader.getHarness(MatMenuHarness);
    await menu.open();
    await menu.clickItem({ text: 'Duplicate' });
    const { request } = calls.expectOne({ url: '/api/receivers', method: 'POST' });

    expect(request.body).toMatchObject({ name: 'Copy of Kestrel', ifHz: 455_000 });
    expect(request.body).not.toHaveProperty('id');
  });

  it('offers no deletion of what the user may not change', async () => {
    const { answer, loader } = await arrange();
    await answer(pageOf(stored(1, 'Kestrel', false)));

    const menu = await loader.getHarness(MatMenuHarness);
    await menu.open();

    expect(await menu.getItems({ text: 'Delete' })).toEqual([]);
  });
});
