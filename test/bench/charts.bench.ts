/**
 * Longest tasks of the page's main thread in Chromium: while the IF's marker is dragged with 5000
 * stations, while a chart of them is panned, and with 20,000. What counts is 50 ms.
 */
import type { Page } from 'playwright-core';

import { openBrowser, openPage, signIn } from '../support/browser.ts';
import { Product } from '../support/product.ts';

const MOVES = 60;
const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';

/** Answers the page's question for fields with so many stations around the IF. */
async function crowd(page: Page, count: number): Promise<void> {
  await page.unrouteAll();
  await page.route('**/api/field-strengths', (route) =>
    route.fulfill({
      json: {
        fields: Array.from({ length: count }, (_, station) => ({
          station,
          name: `Station ${station}`,
          frequencyHz: 520_000 + Math.round((80_000 * station) / count),
          distanceM: 50_000,
          groundDb: 20 + ((station * 37) % 60),
          skyDb: null,
          fieldDb: 20 + ((station * 37) % 60),
          notes: [],
        })),
      },
    }),
  );
}

async function watch(page: Page): Promise<void> {
  await page.evaluate(() => {
    const tasks: number[] = [];
    Object.assign(window, { longTasks: tasks });
    new PerformanceObserver((list) => {
      for (const { duration } of list.getEntries()) tasks.push(duration);
    }).observe({ type: 'longtask' });
  });
}

async function longTasks(page: Page): Promise<string> {
  await page.waitForTimeout(500);
  const tasks = await page.evaluate(() =>
    (window as unknown as { longTasks: number[] }).longTasks.splice(0),
  );
  const longest = Math.max(0, ...tasks);
  return tasks.length === 0
    ? 'no task over 50 ms'
    : `${tasks.length} tasks over 50 ms, the longest ${longest.toFixed(0)} ms`;
}

async function drag(page: Page, from: { x: number; y: number }, by: number): Promise<void> {
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  for (let move = 1; move <= MOVES; move++) {
    await page.mouse.move(from.x + (by * move) / MOVES, from.y);
    await page.waitForTimeout(16);
  }
  await page.mouse.up();
}

const middleOf = async (page: Page, selector: string) => {
  const box = await page.locator(selector).first().boundingBox();
  if (!box) throw new Error(`${selector} is not shown.`);
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
};

async function measured(page: Page, count: number): Promise<string[]> {
  await crowd(page, count);
  await page.reload();
  await page.locator('app-candidate-lane').waitFor();
  await page.waitForLoadState('networkidle');
  await watch(page);
  await drag(page, await middleOf(page, 'app-if-marker'), -120);
  const dragged = await longTasks(page);
  await page.locator('app-choice-chart').getByRole('button', { name: 'Zoom in' }).click();
  await longTasks(page);
  await drag(page, await middleOf(page, 'app-choice-chart app-plot'), 200);
  const panned = await longTasks(page);
  return [
    `${count} stations, marker dragged: ${dragged}`,
    `${count} stations, chart panned: ${panned}`,
  ];
}

/** Measures and answers the lines to print. */
export async function run(): Promise<string[]> {
  const product = new Product();
  await product.start();
  const browser = await openBrowser();
  try {
    const page = await openPage(browser, product.url);
    const member = product.signIns.find(({ role }) => role === 'member');
    if (!member) throw new Error('The demo club has no member.');
    await signIn(page, member);
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await page.locator('app-candidate-lane').waitFor();
    const lines: string[] = [];
    for (const count of [2000, 5000, 20_000]) lines.push(...(await measured(page, count)));
    return lines;
  } finally {
    await browser.close();
    await product.remove();
  }
}
