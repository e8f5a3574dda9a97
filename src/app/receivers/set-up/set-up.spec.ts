import { TestKey } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatExpansionPanelHarness } from '@angular/material/expansion/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatRadioButtonHarness } from '@angular/material/radio/testing';
import { MatSelectHarness } from '@angular/material/select/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { receiverDraft, type StoredReceiver } from '../../../../shared/contracts/receiver';
import { Session } from '../../core/session/session';
import { Confirm } from '../../ui/confirm/confirm';
import { FormProblemsHarness } from '../../ui/form-problems/form-problems-harness';
import { unsavedChangesGuard } from '../../ui/unsaved-changes-guard';
import { ConflictHarness } from './conflict/conflict-harness';
import { SetUp } from './set-up';
import { SetUpStore } from './set-up-store';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Elsewhere {}

const kestrel: StoredReceiver = {
  ...receiverDraft.parse({
    name: 'Kestrel',
    ifHz: 455_000,
    selectivity: { kind: 'widths', b6Hz: 8000, b60Hz: 45_000 },
    bands: [{ name: 'Medium wave', lowHz: 520_000, highHz: 1_610_000, oscillator: 'above' }],
  }),
  id: 3,
  editable: true,
  ownerName: 'Ada',
  version: 4,
  createdAt: '2026-01-01T00:00:00Z',
  updatedAt: '2026-01-02T00:00:00Z',
};
const setUp = { component: SetUp, providers: [SetUpStore], canDeactivate: [unsavedChangesGuard] };

async function arrange(address: string) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      { provide: Session, useValue: { user: signal({ id: 1 }) } },
      provideRouter(
        [
          { path: 'receivers/new', ...setUp },
          { path: 'receivers/:id/set-up', ...setUp },
          { path: '**', component: Elsewhere },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  const page = await RouterTestingHarness.create();
  await page.navigateByUrl(address);
  const calls = TestBed.inject(HttpTestingController);
  const loader = TestbedHarnessEnvironment.documentRootLoader(page.fixture);
  const input = async (label: string) => {
    const field = await loader.getHarness(MatFormFieldHarness.with({ floatingLabelText: label }));
    const control = await field.getControl(MatInputHarness);
    if (!control) throw new Error(`The field "${label}" has no input.`);
    return control;
  };
  const press = async (text: string) =>
    (await loader.getHarness(MatButtonHarness.with({ text }))).click();
  const load = async (receiver = kestrel) => {
    page.detectChanges();
    calls.expectOne(`/api/receivers/${receiver.id}`).flush(receiver);
    await page.fixture.whenStable();
  };
  return { page, calls, loader, input, press, load, router: TestBed.inject(Router) };
}

// The first to draw the whole form compiles it: seconds on a busy machine.
describe('setting up a receiver', { timeout: 20_000 }, () => {
  beforeEach(() => localStorage.clear());

  it('begins with a type of set, a name and nothing else', async () => {
    const { loader, calls, input, press, router } = await arrange('/receivers/new');

    const type = MatRadioButtonHarness.with({ label: /^Domestic set, one/u });
    await (await loader.getHarness(type)).check();
    await (await input('Name')).setValue('Kestrel');
    await press('Save');
    const call = calls.expectOne({ url: '/api/receivers', method: 'POST' });
    expect(call.request.body).toMatchObject({ name: 'Kestrel', ifHz: 455_000 });
    call.flush(kestrel);

    await vi.waitFor(() => {
      expect(router.url).toBe('/receivers/3');
    });
  });

  it('begins from what the address brings along', async () => {
    const { input } = await arrange('/receivers/new?type=marine&ifHz=500000');

    expect(await (await input('IF')).getValue()).toBe('500');
  });

  it('keeps an aerial, a second conversion and a band that mixes with a harmonic as they are', async () => {
    const { calls, input, press, load } = await arrange('/receivers/3/set-up');
    const [band] = kestrel.bands;
    if (!band) throw new Error('The receiver has no band.');
    await load({
      ...kestrel,
      aerial: { kind: 'primary', resonanceHz: 380_000, q: 30 },
      secondConversion: { ifHz: 85_000, oscillator: 'below' },
      bands: [{ ...band, oscillatorHarmonic: 2 }],
    });

    await (await input('Resonance of the primary')).setValue('300');
    await (await input('Second IF')).setValue('50');
    await (await input('Harmonic of the oscillator')).setValue('3');
    await press('Save');

    const { request } = calls.expectOne({ url: '/api/receivers/3', method: 'PUT' });
    expect(request.body).toMatchObject({
      aerial: { kind: 'primary', resonanceHz: 300_000, q: 30 },
      secondConversion: { ifHz: 50_000, oscillator: 'below' },
      bands: [{ oscillatorHarmonic: 3 }],
    });
  });

  it('takes a selectivity by its IF transformers', async () => {
    const { calls, loader, input, press, load } = await arrange('/receivers/3/set-up');
    await load();
    const known = MatFormFieldHarness.with({ floatingLabelText: 'Selectivity known by' });
    const select = await (await loader.getHarness(known)).getControl(MatSelectHarness);
    await (await select?.host())?.sendKeys(TestKey.DOWN_ARROW);
    await press('Save');
    calls.verify();
    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual([
      'Give the loaded Q of each winding, for example 60.',
    ]);

    await (await input('Q of a winding')).setValue('60');
    await press('Save');

    const { request } = calls.expectOne({ url: '/api/receivers/3', method: 'PUT' });
    expect(request.body).toMatchObject({
      selectivity: { kind: 'transformers', count: 2, q: 60, coupling: 1 },
    });
  });

  it('says everything that is wrong, and opens what hides it', async () => {
    const { calls, loader, input, press, load } = await arrange('/receivers/3/set-up');
    await load();
    await (await input('IF')).setValue('none');
    await (await input('Width at −60 dB')).setValue('6');

    await press('Save');

    calls.verify();
    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual([
      expect.stringContaining('Give a number, with kHz or without') as string,
      'The width at -60 dB must be larger than the width at -6 dB.',
    ]);
    const panel = MatExpansionPanelHarness.with({ title: 'Selectivity and audio' });
    expect(await (await loader.getHarness(panel)).isExpanded()).toBe(true);
  });

  it('shows both states when somebody saved first, and can save over them', async () => {
    const { calls, loader, input, press, load } = await arrange('/receivers/3/set-up');
    await load();
    await (await input('IF')).setValue('460');
    await press('Save');
    const current = { ...kestrel, ifHz: 465_000, version: 5 };
    const problem = { type: 'receiver-changed', title: 'Changed.', status: 409, instance: 'a' };
    const first = calls.expectOne({ url: '/api/receivers/3', method: 'PUT' });
    first.flush({ ...problem, current }, { status: 409, statusText: 'Conflict' });

    const conflict = await vi.waitFor(() => loader.getHarness(ConflictHarness));
    expect(await conflict.rows()).toEqual([['IF', '460\u00a0kHz', '465\u00a0kHz']]);
    await press('Save mine over it');
    const second = calls.expectOne({ url: '/api/receivers/3', method: 'PUT' });
    expect(first.request.body).toMatchObject({ version: 4, ifHz: 460_000 });
    expect(second.request.body).toMatchObject({ version: 5, ifHz: 460_000 });
  });

  it('asks before unsaved work is left', async () => {
    const { input, load, router } = await arrange('/receivers/3/set-up');
    await load();
    await (await input('IF')).setValue('460');
    const question = vi.spyOn(TestBed.inject(Confirm), 'ask').mockResolvedValue(false);

    expect(await router.navigateByUrl('/sites')).toBe(false);
    expect(question).toHaveBeenCalledOnce();
    expect(await (await input('IF')).getValue()).toBe('460');
  });

  it('brings unsaved changes back after the tab was closed', async () => {
    const before = await arrange('/receivers/3/set-up');
    await before.load();
    await (await before.input('IF')).setValue('460');
    await vi.waitFor(() => {
      expect(localStorage).toHaveLength(1);
    });
    TestBed.resetTestingModule();

    const { input, press, load } = await arrange('/receivers/3/set-up');
    await load();
    expect(await (await input('IF')).getValue()).toBe('460');
    await press('Discard them');

    expect(await (await input('IF')).getValue()).toBe('455');
    expect(localStorage).toHaveLength(0);
  });

  it('lets nobody change what is not theirs', async () => {
    const { loader, input, load } = await arrange('/receivers/3/set-up');

    await load({ ...kestrel, editable: false });

    expect(await (await input('IF')).isDisabled()).toBe(true);
    expect(await loader.getAllHarnesses(MatButtonHarness.with({ text: 'Save' }))).toEqual([]);
  });
});
