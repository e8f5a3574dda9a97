import { TestKey } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';

import { PlotHarness } from '../plot/plot-harness';
import { TwinTableHarness } from '../twin-table/twin-table-harness';
import { BandStrip } from './band-strip';
import { type JudgedBand, type JudgedResponse, loudness } from './strip-layout';

const response = (at: number): JudgedResponse => ({
  station: at,
  cause: at % 2 === 0 ? 'image' : 'half-if',
  name: 'image',
  m: 1,
  n: 1,
  dialHz: 560_000 + at * 40_000,
  beatHz: 1000,
  fieldDb: 70,
  distanceM: 50_000,
  interferenceDb: 20 + at,
  weightingDb: 14.082,
  wantedDb: 60,
  wantedStation: null,
  noiseDb: 16.424,
  bandDb: null,
  ratioDb: 25.9 - at,
  marginDb: -4,
  grade: 'annoying',
  hidden: at === 3 ? 'noise' : null,
  borderline: false,
  ledger: [],
});

const responses = Array.from({ length: 20 }, (_, at) => response(at));
const band: JudgedBand = {
  name: 'Medium wave',
  oscillatorHz: { low: 1_005_000, high: 2_055_000 },
  imageHz: { low: 1_460_000, high: 2_510_000 },
  rejection: [
    { dialHz: 550_000, imageDb: 50, ifDb: 25 },
    { dialHz: 1_600_000, imageDb: 40, ifDb: 45 },
  ],
  secondOscillator: [],
  harmonics: [{ harmonic: 2, dialHz: 910_000 }],
  totals: [],
  total: 31,
  responses,
};

@Component({
  imports: [BandStrip],
  template: `
    <app-band-strip
      [band]="band"
      [range]="{ low: 550000, high: 1600000 }"
      [stations]="stations"
      [noise]="noise"
      [loudness]="loudness"
      [(picked)]="picked"
      (working)="worked.set($event)"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly band = band;
  readonly stations = responses.map(({ station }) => ({
    id: station,
    name: `Station ${station}`,
    frequencyHz: 1_700_000,
    fieldDb: 70,
    distanceM: 50_000,
  }));
  readonly loudness = loudness([band]);
  readonly picked = signal<string | null>(null);
  readonly worked = signal<string | null>(null);
  readonly noise = () => 16.424;
}

async function open() {
  const fixture = TestBed.createComponent(Page);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  return { page: fixture.componentInstance, loader, plot: await loader.getHarness(PlotHarness) };
}

describe('a band strip', () => {
  it('reads out at every mark exactly what the answer says', async () => {
    const { plot } = await open();

    for (const { interferenceDb, ratioDb } of responses) {
      await plot.press(TestKey.RIGHT_ARROW);
      const lines = await plot.lines();
      const over = (interferenceDb ?? 0) + 14.082 - 16.424;

      expect(lines['Over the noise']).toBe(`${over.toFixed(1)} dB`);
      expect(lines['Wanted to unwanted']).toBe(`${(ratioDb ?? 0).toFixed(1)} dB`);
    }
  });

  it('leads from a mark to its working with Enter', async () => {
    const { page, plot } = await open();

    await plot.press(TestKey.HOME, TestKey.ENTER);

    expect(page.worked()).toBe(page.picked());
    expect(page.worked()).toContain('Medium wave');
  });

  it('describes itself with the numbers of the answer', async () => {
    const { plot } = await open();

    expect(await plot.name()).toBe(
      'Medium wave, 550–1600 kHz. 19 responses rise over noise and band; the loudest is ' +
        'Station 19 (half-IF response) at 1320\u00a0kHz, 37 dB over the noise. ' +
        'The 11 faintest are not drawn.',
    );
  });

  it('has a row in its table for every response, hidden ones named as such', async () => {
    const { loader } = await open();
    await (await loader.getHarness(MatButtonHarness.with({ text: /Table/ }))).click();
    const table = await loader.getHarness(TwinTableHarness);

    expect(await table.rowNames()).toHaveLength(responses.length);
    expect(await table.cellTexts()).toContain('hidden by noise');
  });
});
