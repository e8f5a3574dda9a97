import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatPaginatorHarness } from '@angular/material/paginator/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { CorrectionStore } from '../correction-store';
import { correctionOf } from '../stations-for-specs';
import { CorrectionList } from './correction-list';

const LIST = 'GET /api/regions/1/corrections?page=1&pageSize=20';
const SECOND = 'GET /api/regions/1/corrections?page=2&pageSize=20';
const REMOVE = 'DELETE /api/regions/1/corrections/7';

async function show(items: readonly object[], total = items.length) {
  const server = new FakeServer().on(LIST, () => ({ items, total })).on(REMOVE, () => null);
  TestBed.configureTestingModule({
    providers: [CorrectionStore, provideHttpClient(withInterceptors([server.intercept]))],
  });
  const fixture = TestBed.createComponent(CorrectionList);
  fixture.componentRef.setInput('regionId', 1);
  const loader = TestbedHarnessEnvironment.documentRootLoader(fixture);
  const element = fixture.nativeElement as HTMLElement;
  await fixture.whenStable();
  return {
    server,
    loader,
    text: async () => {
      await fixture.whenStable();
      return element.textContent.replace(/\s+/g, ' ');
    },
    takeBack: async (answer: string) => {
      await (await loader.getHarness(MatButtonHarness.with({ text: /Take back/ }))).click();
      const dialog = await loader.getHarness(MatDialogHarness);
      await (await dialog.getHarness(MatButtonHarness.with({ text: answer }))).click();
      await vi.waitFor(async () => {
        expect(await loader.getAllHarnesses(MatDialogHarness)).toEqual([]);
      });
      await fixture.whenStable();
    },
  };
}

describe('CorrectionList', () => {
  it('says of each what was done to which station, by whom and why', async () => {
    const { text } = await show([correctionOf('changed')]);

    expect(await text()).toContain('Ferry Point, 613.5');
    expect(await text()).toContain('changed by hand: Ada Quill, 2 Mar 2026');
    expect(await text()).toContain('Power by night: 250 W');
    expect(await text()).toContain('Silent all week');
  });

  it('says where a station is no longer listed', async () => {
    const { text } = await show([{ ...correctionOf('heard'), stationId: null }]);

    expect(await text()).toContain('Not in the latest edition.');
  });

  it('leads on when there is none yet', async () => {
    const { text } = await show([]);

    expect(await text()).toContain('Nothing yet.');
  });

  it('takes one back once that is agreed to, and is read anew', async () => {
    const { server, text, takeBack } = await show([correctionOf('off-air')]);

    await takeBack('Keep it');
    expect(server.sent(REMOVE)).toEqual([]);
    server.on(LIST, () => ({ items: [], total: 0 }));
    await takeBack('Take it back');

    expect(server.sent(REMOVE)).toHaveLength(1);
    expect(await text()).toContain('Nothing yet.');
  });

  it('says why one could not be taken back, and keeps it', async () => {
    const { server, text, takeBack } = await show([correctionOf('off-air')]);
    server.on(REMOVE, () => problemOf(403, 'Only who noted it takes it back.'));

    await takeBack('Take it back');

    expect(await text()).toContain('Only who noted it takes it back.');
    expect(await text()).toContain('Ferry Point');
  });

  it('offers nothing to who may not take it back', async () => {
    const { loader } = await show([{ ...correctionOf('heard'), editable: false }]);

    expect(await loader.getAllHarnesses(MatButtonHarness)).toEqual([]);
  });

  it('turns the page on the server', async () => {
    const { server, text, loader } = await show([correctionOf('heard')], 21);
    const other = { ...correctionOf('heard'), id: 8, note: 'Louder than ever' };
    server.on(SECOND, () => ({ items: [other], total: 21 }));

    await (await loader.getHarness(MatPaginatorHarness)).goToNextPage();

    expect(await text()).toContain('Louder than ever');
  });
});
