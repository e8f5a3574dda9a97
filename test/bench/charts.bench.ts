/**
 * Longest tasks of the page's main thread in Chromium while a receiver of six bands is looked at
 * against lists of 5000 and 20,000 stations: the marker dragged, charts panned, a mark picked; and
 * how soon the server confirms a moved IF. A task counts by its processor time beside its time by
 * the clock: what else runs on the machine lengthens only the latter.
 */
import { cpus, loadavg } from 'node:os';

import type { Browser, Page } from 'playwright-core';

import { openBrowser, openPage, signIn } from '../support/browser.ts';
import { Product } from '../support/product.ts';
import { BENCH_RECEIVER, seeded, seededStations } from '../support/seeded-list.ts';
import { held, told, type Verdict } from './measure.ts';
import { bringList, createReceiver } from './page-client.ts';
import { type Tasks, tasksDuring } from './page-tasks.ts';

const MOVES = 25;
const LONGEST_MS = 50;
const CONFIRMED_MS = 150;
const PICKED_MS = 100;
const CONFIRMATIONS = 20;

/** So many in every ten stations lie around the IF, where the choice of it shows them. */
const AROUND_THE_IF = 4;

/** A list as a regulator would give it, with places and powers. */
function list(count: number): string {
  const random = seeded(2);
  const rows = seededStations(count).map(({ frequencyHz }, at) => {
    const hz = at % 10 < AROUND_THE_IF ? 405_000 + 500 * Math.floor(210 * random()) : frequencyHz;
    const place = [40 + 15 * random(), 20 * random()].map((degrees) => degrees.toFixed(4));
    const power = (100 * random() ** 3 + 0.1).toFixed(2);
    return `Station ${at},${hz / 1000},${place.join(',')},${power},${power}`;
  });
  return ['name,frequency_khz,latitude,longitude,power_day_kw,power_night_kw', ...rows].join('\n');
}

const middleOf = async (page: Page, selector: string) => {
  const found = page.locator(selector).first();
  await found.scrollIntoViewIfNeeded();
  const box = await found.boundingBox();
  if (!box) throw new Error(`${selector} is not shown.`);
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
};

async function drag(page: Page, selector: string, by: number): Promise<void> {
  const from = await middleOf(page, selector);
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  for (let move = 1; move <= MOVES; move++) {
    await page.mouse.move(from.x + (by * move) / MOVES, from.y);
    await page.waitForTimeout(16);
  }
  await page.mouse.up();
  await page.waitForTimeout(700);
}

const verdict = (what: string, { count, longestMs, longestCpuMs }: Tasks): Verdict =>
  held(
    `${what}: ${count} tasks over ${LONGEST_MS} ms by the clock, the longest ${longestMs.toFixed(0)} ms; by processor time ${longestCpuMs.toFixed(0)} ms`,
    longestCpuMs,
    LONGEST_MS,
    'ms',
  );

/** A figure by the clock fails the run only on a machine that has nothing else to do. */
function byClock(verdict: Verdict): Verdict {
  const [load = 0] = loadavg();
  if (load <= cpus().length) return verdict;
  return told(`${verdict.text} (other work on this machine: load ${load.toFixed(1)})`);
}

/** How soon after a key on the marker the server's answer is there, without the pause before it asks. */
async function confirmation(page: Page): Promise<Verdict> {
  const marker = page.getByRole('slider', { name: /IF/ });
  const took: number[] = [];
  for (let at = 0; at < CONFIRMATIONS; at++) {
    const [answer] = await Promise.all([
      page.waitForResponse((response) => response.url().endsWith('/api/assessments')),
      marker.press('ArrowRight'),
    ]);
    await answer.finished();
    took.push(answer.request().timing().responseEnd);
  }
  const sorted = took.sort((a, b) => a - b);
  const p95 = sorted[Math.ceil(0.95 * sorted.length) - 1] ?? NaN;
  const middle = sorted[Math.floor(sorted.length / 2)] ?? NaN;
  return byClock(
    held(
      `server's confirmation of a moved IF: median ${middle.toFixed(0)} ms, p95 ${p95.toFixed(0)} ms`,
      p95,
      CONFIRMED_MS,
      'ms',
    ),
  );
}

/** How soon a mark picked in one chart is marked in the other chart and in the table. */
async function picking(page: Page): Promise<Verdict> {
  const took = await page.evaluate(async () => {
    const [surface] = document.querySelectorAll<HTMLElement>('app-band-strip [role=application]');
    surface?.focus();
    const times: number[] = [];
    for (let at = 0; at < 12; at++) {
      const before = document.querySelector('app-response-table tr[aria-current]')?.textContent;
      const begin = performance.now();
      surface?.dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowRight', bubbles: true }));
      while (
        document.querySelector('app-response-table tr[aria-current]')?.textContent === before &&
        performance.now() - begin < 400
      )
        await new Promise(requestAnimationFrame);
      times.push(performance.now() - begin);
    }
    // A wanted station under the dial has no row: its key moves nothing in the table.
    return times.filter((each) => each < 400);
  });
  const longest = Math.max(...took);
  return byClock(
    held(
      `a mark picked in a strip is picked in the table after ${longest.toFixed(0)} ms at most (${took.length} marks)`,
      took.length > 0 ? longest : Infinity,
      PICKED_MS,
      'ms',
    ),
  );
}

async function measured(page: Page, count: number, address: string): Promise<Verdict[]> {
  await page.goto(address);
  await page.locator('app-candidate-lane').waitFor({ timeout: 60_000 });
  await page.waitForLoadState('networkidle');
  const verdicts: Verdict[] = [];
  const watch = async (what: string, act: () => Promise<void>) => {
    verdicts.push(verdict(`${count} stations, ${what}`, await tasksDuring(page, act)));
  };
  await watch('marker dragged', () => drag(page, 'app-if-marker', -120));
  if (count === 5000) verdicts.push(await confirmation(page));
  const marks = await page.locator('app-choice-chart .description').innerText();
  verdicts.push(told(`the chart of ${marks.replace(/\..*/s, '')}`));
  await page.locator('app-choice-chart').getByRole('button', { name: 'Zoom in' }).click();
  await watch('chart panned', () => drag(page, 'app-choice-chart app-plot', 200));
  await page.getByRole('tab', { name: 'Dial', exact: true }).click();
  await page.locator('app-band-strip').first().waitFor({ timeout: 60_000 });
  await page.waitForLoadState('networkidle');
  await watch('IF typed on the dial, six strips drawn anew', async () => {
    for (let at = 0; at < 2; at++) {
      await page
        .getByLabel('IF on trial')
        .first()
        .fill(String(450 + at));
      await page.getByLabel('IF on trial').first().press('Enter');
      await page.waitForTimeout(900);
    }
  });
  const strip = page.locator('app-band-strip').nth(1);
  await strip.getByRole('button', { name: 'Zoom in' }).click();
  await watch('strip panned', () => drag(page, 'app-band-strip:nth-of-type(1) app-plot', 200));
  if (count === 5000) verdicts.push(await picking(page));
  return verdicts;
}

/** Measures and answers the lines to print. */
export async function run(): Promise<Verdict[]> {
  const product = new Product();
  let browser: Browser | undefined;
  try {
    await product.start({ LIMIT_COMPUTE_ACCOUNT: '1000000' });
    browser = await openBrowser();
    return await inBrowser(browser, product);
  } finally {
    await browser?.close();
    await product.remove();
  }
}

export async function inBrowser(browser: Browser, { url, signIns }: Product): Promise<Verdict[]> {
  const librarian = signIns.find(({ role }) => role === 'librarian');
  if (!librarian) throw new Error('The demo club has no librarian.');
  const page = await openPage(browser, url);
  await signIn(page, librarian);
  const receiver = await createReceiver(page, { ...BENCH_RECEIVER, name: 'Six bands' });
  const verdicts: Verdict[] = [];
  for (const count of [5000, 20_000]) {
    const edition = await bringList(page, list(count));
    verdicts.push(...(await measured(page, count, `/receivers/${receiver}?edition=${edition}`)));
  }
  return verdicts;
}
