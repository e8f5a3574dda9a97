import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButtonHarness } from '@angular/material/button/testing';

import { CAUTION } from '../../../../shared/radio/caution';
import { problemOf } from '../../core/fake-server';
import { AROUND, openPart, sampleCure, sampleServer } from '../choice-page/choice-sample';
import { CuresTable } from './cures-table';

@Component({
  imports: [CuresTable],
  providers: AROUND,
  template: '<app-cures-table />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {}

const CURES = 'POST /api/cures';
const trap = {
  kind: 'parallel',
  inductanceH: 250e-6,
  capacitanceF: 323e-12,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
} as const;
const pair = { inductanceH: 240e-6, capacitanceF: 330e-12 };
const both = sampleCure({
  kind: 'move-if-and-trap',
  name: 'Move the IF to 555 kHz, and a trap for 560 kHz',
  deficitAfterDb: 3.6,
  costDb: 0.4,
  parts: ['Coil of 250 uH'],
  ifHz: 555_000,
  trap: { frequencyHz: 560_000, coilH: 250e-6, trap, pairs: { E12: pair, E24: pair } },
});
const circuit = sampleCure({
  kind: 'one-more-circuit',
  name: 'One more tuned circuit on every band',
  deficitAfterDb: 22,
  reversible: false,
});

const open = (answer: () => unknown, query?: string) =>
  openPart(Page, sampleServer().on(CURES, answer), query);
const press = async (part: Awaited<ReturnType<typeof open>>, text: RegExp) => {
  await (await part.loader.getHarness(MatButtonHarness.with({ text }))).click();
  await part.settle();
};

describe('the table of cures', () => {
  it('puts what helps most first, and says in a sentence what it gains and costs', async () => {
    const { text } = await open(() => ({ cures: [circuit, both] }));

    expect(text()).toContain(
      'Most is gained by this: Move the IF to 555 kHz, and a trap for 560 kHz. ' +
        '40 dB left to be desired become 4; it costs 1 dB at the lowest wanted station, ' +
        'needs parts and can be undone.',
    );
    expect(text().indexOf('40 → 4 dB')).toBeLessThan(text().indexOf('40 → 22 dB'));
  });

  it('gives gain in the worst cases, cost, parts, whether it can be undone, and the cautions', async () => {
    const { text } = await open(() => ({ cures: [circuit, both] }));

    expect(text()).toContain('+38.2 dB (3 to 41) Alder at 612 kHz, by night');
    expect(text()).toContain('−0.4 dB');
    expect(text()).toContain('Coil of 250 uH');
    expect(text()).toContain('cannot be undone');
    expect(text()).toContain(CAUTION);
  });

  it('puts a cure on trial in one press, IF and set-up together, and takes it back', async () => {
    const part = await open(() => ({ cures: [both] }));
    await press(part, /^Put on trial/);

    expect(part.query().get('if')).toBe('555000');
    expect(JSON.parse(part.query().get('set') ?? '')).toEqual({ trap });

    await press(part, /^Take back/);
    expect([part.query().get('if'), part.query().get('set')]).toEqual([null, null]);
  });

  it('shows on demand what gains nothing', async () => {
    const idle = sampleCure({ kind: 'screening', name: 'Screen against stray pick-up' });
    const part = await open(() => ({ cures: [idle, both] }));
    expect(part.text()).not.toContain('Screen against stray pick-up');

    await press(part, /^Show 1 more that gain nothing/);
    expect(part.text()).toContain('Screen against stray pick-up');
  });

  it('stays the table of the set as saved while a cure is on trial', async () => {
    const server = sampleServer().on(CURES, () => ({ cures: [both] }));
    await press(await openPart(Page, server), /^Put on trial/);

    expect(server.sent(CURES)).toHaveLength(1);
    expect(server.sent(CURES)[0]).toMatchObject({ receiver: { ifHz: 560_000, trap: null } });
  });

  it('says so when nothing needs a cure, or when the server is away, with a way on', async () => {
    let isAway = true;
    const idle = { ...circuit, deficitBeforeDb: 0, deficitAfterDb: 0 };
    const part = await open(() =>
      isAway ? problemOf(503, 'Back in a moment.') : { cures: [idle] },
    );
    expect(part.text()).toContain('Back in a moment.');

    isAway = false;
    await press(part, /Try again/);
    expect(part.text()).toContain('The set harms no station as it is: nothing needs a cure.');
  });
});
