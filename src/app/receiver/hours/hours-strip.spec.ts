import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { TestKey } from '@angular/cdk/testing';

import { PlotHarness } from '../../charts/plot/plot-harness';
import { problemOf } from '../../core/fake-server';
import { AROUND, openPart, sampleServer } from '../choice-page/choice-sample';
import { HoursStrip } from './hours-strip';

@Component({
  imports: [HoursStrip],
  providers: AROUND,
  template: '<app-hours-strip />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {}

const HOURS = 'POST /api/breakthrough-hours';
const DAY = '2026-12-21';
const hours = Array.from({ length: 48 }, (_, half) => {
  const at = new Date(Date.parse(`${DAY}T00:00:00Z`) + half * 1_800_000).toISOString();
  const levelDb = half < 20 ? 40 : 12;
  const heard = { ratioDb: 20, levelDb, grade: 'annoying', station: 9, dialHz: 612_000 };
  return { at, breakthrough: heard, image: null };
});
const answer = { hours, rises: [], falls: [`${DAY}T10:00:00.000Z`] };
const at = `site=4&edition=7&date=${DAY}`;
const open = (query = at) =>
  openPart(
    Page,
    sampleServer().on(HOURS, () => answer),
    query,
  );

describe('the hours of a day', () => {
  it('say when breakthrough falls, beside the curve', async () => {
    const { text, loader } = await open();

    expect(text()).toContain('Breakthrough has fallen by 10:00 UTC; it is loudest at 00:00, Alder');
    expect(await loader.getHarnessOrNull(PlotHarness)).not.toBeNull();
  });

  it('judge the page at the hour picked by key, and say day or night by the sun', async () => {
    const part = await open();
    const plot = await part.loader.getHarness(PlotHarness);
    await plot.press(TestKey.HOME);
    await plot.press(TestKey.RIGHT_ARROW);
    const judge = MatButtonHarness.with({ text: 'Judge the page at 00:30 UTC' });
    await (await part.loader.getHarness(judge)).click();
    await part.settle();

    expect(part.query().get('at')).toBe(`${DAY}T00:30:00.000Z`);
    expect(part.query().get('period')).toBe('night');
    expect(part.text()).toContain('The page is judged at 00:30 UTC.');
  });

  it('asks for the day that is chosen, and keeps it in the address', async () => {
    const server = sampleServer().on(HOURS, () => answer);
    const part = await openPart(Page, server, at);
    const day = await part.loader.getHarness(MatInputHarness);
    await day.setValue('2026-06-21');
    await (await day.host()).dispatchEvent('change');
    await part.settle();

    expect(part.query().get('date')).toBe('2026-06-21');
    expect(server.sent(HOURS).at(-1)).toMatchObject({ date: '2026-06-21' });
  });

  it('needs a list and a place, and says so', async () => {
    expect((await open('site=4&every=70')).text()).toContain('is the same at every hour');
  });

  it('needs a place for the sun', async () => {
    expect((await open(`site=6&edition=7`)).text()).toContain('The site has no place on the map');
  });

  it('shows what went wrong with a way on', async () => {
    const server = sampleServer().on(HOURS, () => problemOf(503, 'Back in a moment.'));
    const { text } = await openPart(Page, server, at);

    expect(text()).toContain('Back in a moment.');
    expect(text()).toContain('Try again');
  });
});
