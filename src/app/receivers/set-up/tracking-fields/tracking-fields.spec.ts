import { TestKey } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatCheckboxHarness } from '@angular/material/checkbox/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatSelectHarness } from '@angular/material/select/testing';

import { designTracking } from '../../../../../shared/radio/tracking/tracking';
import { trackingRequest } from '../../../../../shared/contracts/tracking';
import { FakeServer, problemOf } from '../../../core/fake-server';
import { receiverControls } from '../receiver-form/controls';
import { receiverOf } from '../receiver-form/fields';
import { TrackingFields } from './tracking-fields';

const CALL = 'POST /api/tracking';

async function arrange() {
  const server = new FakeServer();
  TestBed.configureTestingModule({
    providers: [provideHttpClient(withInterceptors([server.intercept]))],
  });
  const form = receiverControls();
  form.patchValue({ ifHz: 455_000 });
  const band = { name: 'Medium wave', lowHz: 550_000, highHz: 1_600_000 };
  form.controls.bands.at(0).patchValue(band);
  const fixture = TestBed.createComponent(TrackingFields);
  fixture.componentRef.setInput('form', form);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  const field = (label: string) =>
    loader.getHarness(MatFormFieldHarness.with({ floatingLabelText: label }));
  const type = async (label: string, text: string) => {
    const input = await (await field(label)).getControl(MatInputHarness);
    await input?.setValue(text);
    await input?.blur();
  };
  const workOut = async () => {
    await (await loader.getHarness(MatButtonHarness.with({ text: 'Work out the parts' }))).click();
    await fixture.whenStable();
  };
  const text = (selector: string) =>
    [...(fixture.nativeElement as HTMLElement).querySelectorAll(selector)].map(({ textContent }) =>
      textContent.replace(/\s+/gu, ' ').trim(),
    );
  await (await loader.getHarness(MatCheckboxHarness)).check();
  return { server, form, loader, field, type, workOut, text };
}

/** As the server answers it. */
const answerTo = (server: FakeServer) => () =>
  designTracking(trackingRequest.parse(server.sent(CALL).at(-1)));

describe('the tracking of a band', () => {
  it('shows the parts that the server works out, until something is changed', async () => {
    const { server, type, workOut, text } = await arrange();
    server.on(CALL, answerTo(server));
    await type('Gang, open', '40');
    await type('Gang, closed', '400');

    await workOut();

    expect(server.sent(CALL)).toEqual([
      {
        ...{ lowHz: 550_000, highHz: 1_600_000, ifHz: 455_000, oscillator: 'above' },
        ...{ gangMinF: 4e-11, gangMaxF: 4e-10, strayF: 0, trimmer: 'gang', points: 'best' },
      },
    ]);
    expect(text('dt')[3]).toBe('Padder, in the oscillator');
    expect(text('dd')[0]).toBe('205 μH');
    // Minimax points 606.4, 1016.9 and 1514.6 kHz, at most 4.474 kHz off (computed independently).
    expect(text('dd').at(-1)).toBe('±4.474 kHz');

    await type('Stray', '5');
    expect(text('dl')).toEqual([]);
  });

  it('sends points of one’s own, the padder that stays and where the set is aligned', async () => {
    const { server, form, field, type, workOut, text } = await arrange();
    server.on(CALL, answerTo(server));
    await type('Gang, open', '40');
    await type('Gang, closed', '400');
    const points = await (await field('Tracking points')).getControl(MatSelectHarness);
    await (await points?.host())?.sendKeys(TestKey.DOWN_ARROW);
    await type('Lowest point', '600');
    await type('Middle point', '1000');
    await type('Highest point', '1400');
    await type('Padder that stays', '437');
    await type('Aligned low at', '600');
    await type('Aligned high at', '1400');

    await workOut();

    expect(server.sent(CALL)[0]).toMatchObject({
      points: [600_000, 1_000_000, 1_400_000],
      fixedPadderF: 4.37e-10,
      alignHz: [600_000, 1_400_000],
    });
    expect(text('dd')[3]).toBe('437 pF');
    expect(receiverOf(form.getRawValue())).toMatchObject({
      bands: [{ tracking: { points: [600_000, 1_000_000, 1_400_000], fixedPadderF: 4.37e-10 } }],
    });
  });

  it('says why a design is refused', async () => {
    const { server, type, workOut, text } = await arrange();
    server.on(CALL, answerTo(server));
    await type('Gang, open', '200');
    await type('Gang, closed', '210');

    await workOut();

    expect(text('dl')).toEqual([]);
    expect(text('[role=status]')[0]).toMatch(/\w.*\.$/u);
  });

  it('puts what is wrong beside its field, and asks nobody', async () => {
    const { server, field, type, workOut } = await arrange();
    await type('Gang, open', '400');
    await type('Gang, closed', '40');

    await workOut();

    expect(server.calls).toEqual([]);
    expect(await (await field('Gang, closed')).getTextErrors()).toEqual([
      'Give more than the smallest capacitance.',
    ]);
  });

  it('says when the server does not answer', async () => {
    const { server, type, workOut, text } = await arrange();
    server.on(CALL, () => problemOf(429, 'Too many computations. Wait a minute.'));
    await type('Gang, open', '40');
    await type('Gang, closed', '400');

    await workOut();

    expect(text('[role=alert]')).toEqual(['Too many computations. Wait a minute.']);
  });
});
