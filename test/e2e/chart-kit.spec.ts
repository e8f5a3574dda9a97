import { parse } from 'csv-parse/sync';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import { openBrowser, openPage, signIn } from '../support/browser.ts';
import { ChartPage } from '../support/chart-page.ts';
import { closed, printedLines } from '../support/printed-lines.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';

interface ChartCase {
  readonly name: string;
  readonly selector: string;
  readonly tab: string;
  /** What Enter does: a dialog opens, the IF moves, or nothing. */
  readonly enter: 'working' | 'trial' | 'nothing';
  /** Sentences name numbers of this kind. */
  readonly sentence: RegExp;
}

const charts: readonly ChartCase[] = [
  {
    name: 'choice of IF',
    selector: 'app-choice-chart',
    tab: 'Choice of IF',
    enter: 'nothing',
    sentence: /\d+ stations lie between .* dB\(µV\/m\)/,
  },
  {
    name: 'lane of candidates',
    selector: 'app-candidate-lane',
    tab: 'Choice of IF',
    enter: 'trial',
    sentence: /dB at [\d.]+ kHz/,
  },
  {
    name: 'strip of a band',
    selector: 'app-band-strip',
    tab: 'Dial',
    enter: 'working',
    sentence: /rise|Nothing rises/,
  },
  {
    name: 'rejection along a band',
    selector: 'app-line-chart',
    tab: 'Rejection',
    enter: 'nothing',
    sentence: /[\d.]+\sdB/,
  },
];

describe.each(charts)('the chart of the $name', ({ selector, tab, enter, sentence }) => {
  let browser: Browser;
  let page: Page;
  let chart: ChartPage;

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    const member = inject('demoSignIns').find(({ role }) => role === 'member');
    if (!member) throw new Error('The demo club has no member.');
    await signIn(page, member);
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await page.getByRole('tab', { name: tab, exact: true }).click();
    chart = new ChartPage(page, selector);
    await chart.surface.waitFor();
    await page.waitForLoadState('networkidle');
  });

  afterAll(() => browser.close());

  it('reads out by key what it reads out by pointer; Escape removes it', async () => {
    const byKey = await chart.press('Home');
    const spot = await chart.activeSpot();
    expect(byKey).not.toBeNull();

    await page.keyboard.press('Escape');
    expect(await chart.said()).toBeNull();
    await page.mouse.move(spot.x + 1, spot.y + 1);
    const byPointer = await chart.said();
    expect(byPointer).not.toBeNull();

    // It can be gone to with the pointer, and stays there.
    const box = await chart.readout.boundingBox();
    await page.mouse.move((box?.x ?? 0) + 8, (box?.y ?? 0) + 8);
    expect(await chart.said()).toEqual(byPointer);
    await page.keyboard.press('Escape');
    expect(await chart.said()).toBeNull();
    await page.mouse.move(0, 0);
  });

  it('is one tab stop, walked by arrows, Home and End, and said', async () => {
    const first = await chart.press('Home');
    const last = await chart.press('End');
    await chart.press('Home');
    const second = await chart.press('ArrowRight');

    expect(await chart.surface.count()).toBe(1);
    expect(await chart.surface.locator('[tabindex], button, a, input').count()).toBe(0);
    expect(new Set([first, second, last].map((each) => JSON.stringify(each))).size).toBe(3);
    expect(await chart.press('ArrowLeft')).toEqual(first);
    expect(await chart.host.locator('[aria-live]').last().innerText()).toContain(
      first?.title ?? 'a title',
    );
  });

  it('goes on with Enter where that leads anywhere', async () => {
    const before = page.url();
    await chart.press('Home');
    await chart.press('Enter');

    if (enter === 'working') {
      await page.getByRole('dialog').waitFor();
      await page.keyboard.press('Escape');
      await page.getByRole('dialog').waitFor({ state: 'detached' });
    } else if (enter === 'trial') {
      await page.waitForURL((url) => url.searchParams.has('if'));
      await page.goBack();
      await page.waitForURL((url) => !url.searchParams.has('if'));
    } else expect(page.url().split('?')[0]).toBe(before.split('?')[0]);
    await page.waitForLoadState('networkidle');
  });

  it('zooms to the same limits by keys, buttons and typing; pans by dragging', async () => {
    const [low = 0, high = 0] = await chart.limits();
    await chart.press('Home');
    await chart.press('+');
    const byKey = await chart.limits();
    await chart.press('0');
    expect(await chart.limits()).toEqual([low, high]);
    await chart.button('Zoom in').click();
    expect(await chart.limits()).toEqual(byKey);
    await chart.button('Whole range').click();

    const quarter = (high - low) / 4;
    const typed = [Math.round(low + quarter), Math.round(high - quarter)] as const;
    await chart.limit(...typed);
    expect(await chart.limits()).toEqual([...typed]);

    const box = await chart.surface.boundingBox();
    const from = { x: (box?.x ?? 0) + (box?.width ?? 0) / 2, y: (box?.y ?? 0) + 70 };
    await page.mouse.move(from.x, from.y);
    await page.mouse.down();
    await page.mouse.move(from.x + 60, from.y, { steps: 4 });
    await page.mouse.up();
    const [panned = 0] = await chart.limits();
    expect(panned).toBeLessThan(typed[0]);
    await chart.press('0');
  });

  it('lets the page scroll over it', async () => {
    await page.evaluate(() => {
      scrollTo(0, 0);
    });
    await chart.surface.scrollIntoViewIfNeeded();
    const box = await chart.surface.boundingBox();
    await page.mouse.move((box?.x ?? 0) + 60, (box?.y ?? 0) + 40);
    const before = await page.evaluate(() => scrollY);
    await page.mouse.wheel(0, 120);
    await page.waitForFunction((was) => scrollY > was, before);
    expect(await chart.surface.evaluate((each) => getComputedStyle(each).touchAction)).toBe(
      'pan-y',
    );
  });

  it('shows its rows as a table in which the same mark is picked', async () => {
    await chart.press('0');
    await chart.press('Home');
    const last = await chart.press('End');
    await chart.button('Table').click();
    const rows = chart.host.locator('app-twin-table tbody tr');

    expect(await rows.count()).toBeGreaterThan(1);
    if (selector !== 'app-band-strip') {
      const picked = await chart.host.locator('tr[aria-current] button').innerText();
      expect(last?.title).toContain(picked);
    }
    await rows.nth(0).getByRole('button').click();
    await expect.poll(() => rows.nth(0).getAttribute('aria-current')).toBe('true');
    await chart.button('Chart').click();
    await chart.surface.focus();
    await expect.poll(() => chart.host.locator('.picked, line.active').count()).toBeGreaterThan(0);
  });

  it('is saved as picture, dots and rows that say what they rest on', async () => {
    const svg = (await chart.save('SVG')).toString();
    expect(svg).toContain(`Receiver: ${RECEIVER}`);
    expect(svg).toContain('<desc>');
    expect(svg).not.toMatch(/href|url\((?!data:)/);

    expect((await chart.save('PNG')).subarray(1, 4).toString()).toBe('PNG');

    const rows: Record<string, string>[] = parse(await chart.save('CSV'), {
      columns: true,
      bom: true,
    });
    await chart.button('Table').click();
    const shown = await chart.host
      .locator('app-twin-table tbody tr')
      .evaluateAll((each) =>
        each.map((row) =>
          [...row.querySelectorAll('th, td')].map((cell) => cell.textContent.trim()),
        ),
      );
    await chart.button('Chart').click();
    expect(rows.slice(0, shown.length).map((row) => Object.values(row).slice(0, 1))).toEqual(
      shown.map((row) => row.slice(0, 1)),
    );
    expect(rows[0]?.['Receiver']).toBe(RECEIVER);
  });

  it.each(['A4', 'Letter'] as const)('prints every row whole on %s', async (format) => {
    const pdf = await page.pdf({ format });
    await page.evaluate(() => dispatchEvent(new Event('beforeprint')));
    const rows = await chart.host.locator('app-twin-table tbody tr').evaluateAll((each) =>
      each.map((row) =>
        [...row.querySelectorAll('th, td')]
          .map((cell) => cell.textContent.trim())
          .filter(Boolean)
          .join(' '),
      ),
    );
    await page.evaluate(() => dispatchEvent(new Event('afterprint')));

    const lines = new Set((await printedLines(pdf)).flat());

    expect(rows.length).toBeGreaterThan(1);
    expect(rows.filter((row) => !lines.has(closed(row)))).toEqual([]);
    for (const control of ['Zoom in', 'Whole range', 'Save', 'Copy the rows']) {
      expect([...lines].some((line) => line.includes(closed(control)))).toBe(false);
    }
  });

  it('describes itself by its own numbers', async () => {
    const description = await chart.host.locator('.description').innerText();

    expect(description.replaceAll('\u00a0', ' ')).toMatch(sentence);
    expect(await chart.surface.getAttribute('aria-label')).toContain(description);
  });

  it('is laid out again at 320 px: no sideways scroll, no label over another', async () => {
    await page.setViewportSize({ width: 320, height: 700 });
    await page.reload();
    await chart.surface.waitFor();
    await page.waitForLoadState('networkidle');
    await chart.host.scrollIntoViewIfNeeded();
    await page.waitForFunction(() => document.documentElement.scrollWidth <= innerWidth);
    await chart.said();

    expect(await chart.overlaps()).toEqual([]);
    expect(await chart.host.locator('.limits input').first().isVisible()).toBe(true);
    await page.setViewportSize({ width: 1280, height: 800 });
  });
});
