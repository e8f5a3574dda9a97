import { TestKey } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';

import { PlotHarness } from '../plot/plot-harness';
import { TwinTableHarness } from '../twin-table/twin-table-harness';
import { ChoiceChart } from './choice-chart';
import { IfMarkerHarness } from './if-marker-harness';

const stations = Array.from({ length: 20 }, (_, at) => ({
  id: at,
  name: `Station ${at}`,
  frequencyHz: 430_000 + at * 2500,
  fieldDb: 30 + ((at * 37) % 50) + at / 100,
  distanceM: 10_000 * (at + 1),
}));

@Component({
  imports: [ChoiceChart],
  template: `
    <app-choice-chart
      [description]="description"
      [stations]="stations"
      [range]="{ low: 420000, high: 490000 }"
      [reach]="{ low: 428000, high: 482000 }"
      [presentHz]="455000"
      [rejection]="rejection"
      [noiseDb]="18"
      [(trialHz)]="trialHz"
      [(picked)]="picked"
      (settled)="settled.set(trialHz())"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly description = 'Twenty stations.';
  readonly stations = stations;
  readonly trialHz = signal(455_000);
  readonly picked = signal<string | null>(null);
  readonly settled = signal<number | null>(null);
  readonly rejection = (offsetHz: number) => Math.abs(offsetHz) / 1000;
}

function open() {
  const fixture = TestBed.createComponent(Page);
  return { page: fixture.componentInstance, loader: TestbedHarnessEnvironment.loader(fixture) };
}

describe('the chart of the choice of IF', () => {
  it('reads out at every mark, by key, exactly the numbers it was given', async () => {
    const { loader } = open();
    const plot = await loader.getHarness(PlotHarness);

    for (const { fieldDb, frequencyHz, distanceM } of stations) {
      await plot.press(TestKey.RIGHT_ARROW);
      const lines = await plot.lines();

      expect(lines['Field']).toBe(`${fieldDb.toFixed(1)} dB(µV/m)`);
      expect(lines['IF selectivity takes']).toBe(
        `${(Math.abs(frequencyHz - 455_000) / 1000).toFixed(1)} dB`,
      );
      expect(lines['Distance']).toBe(
        `${(distanceM / 1000).toFixed(distanceM < 100_000 ? 1 : 0)} km`,
      );
    }
  });

  it('goes to the first and last mark, and says them', async () => {
    const { loader } = open();
    const plot = await loader.getHarness(PlotHarness);

    await plot.press(TestKey.END);
    expect(await plot.announcement()).toContain('Station 19');
    await plot.press(TestKey.HOME);
    expect(await plot.announcement()).toContain('Station 0');
  });

  it('removes the readout with Escape', async () => {
    const { loader } = open();
    const plot = await loader.getHarness(PlotHarness);
    await plot.press(TestKey.HOME);
    expect(await plot.isReadoutShown()).toBe(true);

    await plot.press(TestKey.ESCAPE);

    expect(await plot.isReadoutShown()).toBe(false);
  });

  it('shows the same rows as a table, and what is picked there is picked in the chart', async () => {
    const { page, loader } = open();
    await (await loader.getHarness(MatButtonHarness.with({ text: /Table/ }))).click();
    const table = await loader.getHarness(TwinTableHarness);
    expect(await table.rowNames()).toEqual(stations.map(({ name }) => name));

    await table.pick('Station 7');

    expect(page.picked()).toBe('station-7');
    expect(await table.pickedName()).toBe('Station 7');
  });

  it('brings a mark that is out of view back into it', async () => {
    const { loader } = open();
    const plot = await loader.getHarness(PlotHarness);
    await plot.press('+', '+', '+', TestKey.END);

    expect((await plot.lines())['Field']).toBe(`${stations[19]?.fieldDb.toFixed(1)} dB(µV/m)`);
  });

  it('moves the IF on trial by keys, in fine steps with Shift, and never off the chart', async () => {
    const { page, loader } = open();
    const marker = await loader.getHarness(IfMarkerHarness);

    await marker.press(TestKey.RIGHT_ARROW);
    expect(page.trialHz()).toBe(455_500);
    await marker.press(TestKey.LEFT_ARROW, { shift: true });
    expect(page.trialHz()).toBe(455_400);
    expect(await marker.value()).toBe('455.4\u00a0kHz');
    await marker.press(TestKey.END);
    expect(page.trialHz()).toBe(490_000);
    await marker.press(TestKey.RIGHT_ARROW);
    expect(page.trialHz()).toBe(490_000);
  });
});
