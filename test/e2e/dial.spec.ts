import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import {
  accessibilityFaults,
  keepPicture,
  openBrowser,
  openPage,
  type Screen,
  signIn,
} from '../support/browser.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';
const screen = (width: number): Screen => ({ width, height: 900, scheme: 'light' });
const SCREENS = [1280, 320].flatMap((width) =>
  (['paper', 'walnut'] as const).map((theme) => [width, theme] as const),
);
const SECTIONS = [
  ['dial', 'What is heard, and why'],
  ['rejection', 'Rejection along the dial'],
  ['whistle', 'Causes, the most likely first'],
] as const;

describe('finding out what is heard on a dial', () => {
  let browser: Browser;
  let page: Page;
  let dial = '';
  /** Where the image was found, as the chart writes it. */
  let imageAt = '';

  const member = () =>
    inject('demoSignIns').find(({ role }) => role === 'member') ??
    expect.fail('There is no member.');
  const plot = () => page.getByRole('application').first();
  const working = () => page.getByRole('dialog');
  const query = () => new URL(page.url()).searchParams;

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    await signIn(page, member());
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await page.getByRole('heading', { name: 'The choice of IF' }).waitFor();
  });

  afterAll(async () => {
    await browser.close();
  });

  it('goes from section to section with site, list and time, and back', async () => {
    await expect.poll(() => query().get('site')).not.toBeNull();
    const chosen = query().toString();
    await page.getByRole('tab', { name: 'Dial', exact: true }).click();
    await page.getByRole('heading', { name: 'What is heard, and why' }).waitFor();

    expect(new URL(page.url()).pathname).toMatch(/^\/receivers\/\d+\/dial$/);
    expect(query().toString()).toBe(chosen);
    dial = new URL(page.url()).pathname + new URL(page.url()).search;
    await page.goBack();
    await page.getByRole('heading', { name: 'The choice of IF' }).waitFor();
    await page.goForward();
    await page.getByRole('heading', { name: 'What is heard, and why' }).waitFor();
  });

  it('finds the cause of an image by keyboard alone', async () => {
    await plot().focus();
    await page.keyboard.press('Home');
    const said = () => page.locator('app-plot').first().locator('[aria-live]').innerText();
    for (let step = 0; step < 400 && !(await said()).includes('Heard as: image'); step++) {
      await page.keyboard.press('ArrowRight');
    }
    expect(await said()).toMatch(/at dial [\d.]+.kHz.*Heard as: image/);
    imageAt = /at dial ([\d.]+.kHz)/.exec(await said())?.[1] ?? '';

    await page.keyboard.press('Enter');
    await working().waitFor();
    const text = await working().innerText();
    expect(text).toContain('Signal circuit 1');
    expect(text).toMatch(/Uncertainty, one sigma/);
    expect(text).toMatch(/bearing \d+° from the aerial/);
    expect(query().get('working')).toContain('response|');

    await page.keyboard.press('Escape');
    await expect.poll(() => working().count()).toBe(0);
    await expect.poll(() => query().get('working')).toBeNull();
    expect(await plot().evaluate((chart) => chart === document.activeElement)).toBe(true);
  });

  it('opens the working again at its address, and gives the focus back to its row', async () => {
    const button = page.getByRole('button', { name: 'Show the working' }).first();
    await button.press('Enter');
    const title = await working().getByRole('heading').innerText();
    await page.goto(page.url());

    expect(await working().getByRole('heading').innerText()).toBe(title);
    await page.keyboard.press('Escape');
    await button.press('Enter');
    await working().waitFor();
    await page.keyboard.press('Escape');
    await expect
      .poll(() => button.evaluate((pressed) => pressed === document.activeElement))
      .toBe(true);
  });

  it('moves the pointer by keys, dragged and typed, and says what is heard there', async () => {
    const field = page.getByRole('textbox', { name: 'Dial setting' });
    await field.fill('1,0 MHz');
    await field.press('Enter');
    await expect.poll(() => query().get('dial')).toBe('1000000');
    await page.getByText(/At 1000.kHz /).waitFor();

    const pointer = page.getByRole('slider', { name: /^Pointer of the dial/ }).first();
    await pointer.press('ArrowRight');
    await expect.poll(() => query().get('dial')).toBe('1001000');
    await page.getByText(/At 1001.kHz /).waitFor();

    // What is heard there moves the strip when it comes.
    await expect.poll(() => page.locator('[aria-busy="true"]').count()).toBe(0);
    await pointer.locator('.flag').scrollIntoViewIfNeeded();
    const flag = await pointer.locator('.flag').boundingBox();
    if (!flag) throw new Error('The pointer is not shown.');
    await page.mouse.move(flag.x + flag.width / 2, flag.y + flag.height / 2);
    await page.mouse.down();
    await page.mouse.move(flag.x + 90, flag.y + 5, { steps: 6 });
    await page.mouse.up();
    await expect.poll(() => Number(query().get('dial'))).toBeGreaterThan(1_010_000);
  });

  it('zooms a band, and back and forward go through what was shown', async () => {
    const strip = page.locator('app-band-strip').first();
    const [from, to] = ['From', 'to'].map((name) => strip.getByRole('textbox', { name }));
    if (!from || !to) throw new Error('The strip has no limits to type.');
    const high = await to.inputValue();
    await from.fill('700');
    await from.press('Enter');
    await expect.poll(() => query().get('zoom')).toMatch(/^1:700000-/);
    await to.fill('800');
    await to.press('Enter');
    await expect.poll(() => query().get('zoom')).toBe('1:700000-800000');

    await page.getByRole('tab', { name: 'Rejection', exact: true }).click();
    await page.getByRole('heading', { name: 'Rejection along the dial' }).waitFor();
    expect(await page.getByRole('textbox', { name: 'From' }).first().inputValue()).toBe('700');
    await page.goBack();
    await page.getByRole('heading', { name: 'What is heard, and why' }).waitFor();
    await page.goBack();
    await expect.poll(() => to.inputValue()).toBe(high);
    expect(await from.inputValue()).toBe('700');
    await page.goForward();
    await expect.poll(() => to.inputValue()).toBe('800');
    await strip.getByRole('button', { name: 'Whole range' }).click();
    await expect.poll(() => query().get('zoom')).toBeNull();
  });

  it('filters by what the address says', async () => {
    await page.getByRole('option', { name: /^IF breakthrough \d+/ }).click();

    await expect.poll(() => query().get('cause')).toBe('breakthrough');
    const causes = page.locator('app-response-table tbody td:nth-of-type(3)');
    await expect
      .poll(async () => new Set((await causes.allInnerTexts()).map((text) => text.trim())))
      .toEqual(new Set(['IF breakthrough']));
    await page.getByRole('button', { name: 'Show all', exact: true }).click();
    await expect.poll(() => query().get('cause')).toBeNull();
  });

  it('traces a whistle from the pointer to its ranked causes', async () => {
    await page.getByRole('link', { name: 'What is this whistle?' }).click();
    await page.getByRole('heading', { name: 'Causes, the most likely first' }).waitFor();
    await page.getByLabel('Dial setting').fill(imageAt);
    await page.getByLabel('Slope, Hz a hertz (optional)').fill('2');
    await page.getByRole('button', { name: 'Find the causes' }).click();

    await expect.poll(() => query().get('slope')).toBe('2');
    await expect.poll(() => page.locator('[aria-busy="true"]').count()).toBe(0);
    expect(query().get('dial')).toBe(String(Math.round(1000 * parseFloat(imageAt))));
    expect(await page.locator('ol > li').first().innerText()).toMatch(
      /.kHz: [^]*Hz a hertz of dial/,
    );
    expect(await page.locator('app-caution').innerText()).toContain('high tension');
  });

  it.each(SCREENS)('is readable for everyone, %d wide on %s', async (width, theme) => {
    const viewer = await openPage(browser, inject('productUrl'), screen(width));
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    await signIn(viewer, member());
    for (const [section, heading] of SECTIONS) {
      await viewer.goto(dial.replace('/dial?', `/${section}?with=one-more-circuit,trap&`));
      await viewer.getByRole('heading', { name: heading }).waitFor();
      await expect.poll(() => viewer.getByRole('progressbar').count()).toBe(0);
      // What is being computed anew is dimmed, too faint to be read for good.
      await expect.poll(() => viewer.locator('[aria-busy="true"]').count()).toBe(0);
      const beyond = () =>
        viewer.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
      await expect.poll(beyond).toBeLessThanOrEqual(0);
      await keepPicture(viewer, `${section}-${width}-${theme}`);
      expect(await accessibilityFaults(viewer)).toEqual([]);
    }
    await viewer.context().close();
  });

  it('answers a visitor with a sentence and a dial, without an account', async () => {
    const visitor = await openPage(browser, inject('productUrl'));
    await visitor.goto('/');
    await visitor.getByRole('combobox', { name: 'Type of set' }).click();
    await visitor.getByRole('option').nth(1).click();
    await visitor.getByRole('textbox', { name: 'IF' }).fill('465');
    await visitor.getByRole('combobox', { name: 'Where' }).click();
    await visitor.getByRole('option', { name: /Region 1/ }).click();

    await visitor.getByRole('heading', { name: /^The dial with an IF of 465.kHz/ }).waitFor();
    const answers = await visitor.getByRole('status').allInnerTexts();
    expect(answers.join(' ')).toMatch(/465/);
    await visitor.getByRole('application', { name: /kHz/ }).first().waitFor();
    await visitor.context().close();
  });
});
