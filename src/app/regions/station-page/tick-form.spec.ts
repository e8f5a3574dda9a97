import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatRadioButtonHarness } from '@angular/material/radio/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { FormProblemsHarness } from '../../ui/form-problems/form-problems-harness';
import { CorrectionStore } from '../correction-store';
import { correctionOf } from '../stations-for-specs';
import { TickForm } from './tick-form';

const CORRECTIONS = 'POST /api/regions/1/corrections';

function show() {
  const server = new FakeServer().on(CORRECTIONS, () => correctionOf('off-air'));
  TestBed.configureTestingModule({
    providers: [CorrectionStore, provideHttpClient(withInterceptors([server.intercept]))],
  });
  const fixture = TestBed.createComponent(TickForm);
  fixture.componentRef.setInput('regionId', 1);
  fixture.componentRef.setInput('stationId', 7);
  const noted = vi.fn();
  fixture.componentInstance.noted.subscribe(noted);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  return {
    server,
    noted,
    loader,
    tick: async (label: string) =>
      (await loader.getHarness(MatRadioButtonHarness.with({ label }))).check(),
    note: () => loader.getHarness(MatInputHarness.with({ label: 'Note' })),
    send: async () => (await loader.getHarness(MatButtonHarness.with({ text: 'Note it' }))).click(),
  };
}

describe('TickForm', () => {
  it('notes what was found, with the words to it, and is empty again', async () => {
    const { server, noted, tick, note, send } = show();
    await tick('Off the air');
    await (await note()).setValue('Silent all week');

    await send();

    expect(server.sent(CORRECTIONS)).toEqual([
      { kind: 'off-air', stationId: 7, note: 'Silent all week' },
    ]);
    expect(noted).toHaveBeenCalledTimes(1);
    expect(await (await note()).getValue()).toBe('');
  });

  it('sends nothing before one says which it was', async () => {
    const { server, noted, loader, send } = show();

    await send();

    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual([
      'Say whether you heard it, or found it off the air.',
    ]);
    expect(server.calls).toEqual([]);
    expect(noted).not.toHaveBeenCalled();
  });

  it('keeps what was typed when the server refuses', async () => {
    const { server, noted, loader, tick, note, send } = show();
    server.on(CORRECTIONS, () => problemOf(404, 'The station is gone.'));
    await tick('Heard');
    await (await note()).setValue('Weak');

    await send();

    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual(['The station is gone.']);
    expect(await (await note()).getValue()).toBe('Weak');
    expect(noted).not.toHaveBeenCalled();
  });
});
