import { TestKey } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';

import { DayStrip } from '../day-strip/day-strip';
import { PlotHarness } from '../plot/plot-harness';
import { TwinTableHarness } from '../twin-table/twin-table-harness';
import { LineChart } from './line-chart';

const points = (levels: readonly number[], step: number) =>
  levels.map((level, index) => ({ at: index * step, level }));

const words = [
  inputBinding('heading', () => 'Rejection'),
  inputBinding('description', () => 'Least at 2 MHz.'),
  inputBinding('levelLabel', () => 'rejection, dB'),
];

describe('a line chart', () => {
  const open = () => {
    const curves = [
      { id: 'now', name: 'as it is', points: points([52.13, 41, 31.25], 1_000_000) },
      { id: 'more', name: 'one more circuit', points: points([80, 66.6, 51.04], 1_000_000) },
    ];
    const bindings = [
      ...words,
      inputBinding('curves', () => curves),
      inputBinding('range', () => ({ low: 0, high: 2_000_000 })),
    ];
    return TestbedHarnessEnvironment.loader(TestBed.createComponent(LineChart, { bindings }));
  };

  it('reads out every curve at once, exactly as given', async () => {
    const plot = await open().getHarness(PlotHarness);

    await plot.press(TestKey.END);

    expect(await plot.lines()).toEqual({ 'as it is': '31.3 dB', 'one more circuit': '51.0 dB' });
    expect(await plot.announcement()).toContain('2000');
  });

  it('shows the same as a table, a row for each place', async () => {
    const loader = open();
    await (await loader.getHarness(MatButtonHarness.with({ text: /Table/ }))).click();
    const table = await loader.getHarness(TwinTableHarness);

    expect(await table.rowNames()).toEqual(['0', '1000', '2000']);
    expect(await table.cellTexts()).toEqual(['52.1', '80.0', '41.0', '66.6', '31.3', '51.0']);
  });
});

describe('a strip of 24 hours', () => {
  it('reads out the time of day and each level', async () => {
    const bindings = [
      ...words,
      inputBinding('curves', () => [
        { id: 'b', name: 'breakthrough', points: points([1, 2, 9], 390) },
      ]),
      inputBinding('nights', () => [[0, 372]]),
    ];
    const fixture = TestBed.createComponent(DayStrip, { bindings });
    const plot = await TestbedHarnessEnvironment.loader(fixture).getHarness(PlotHarness);

    await plot.press(TestKey.END);

    expect(await plot.announcement()).toBe('13:00. breakthrough: 9.0 dB.');
  });
});
