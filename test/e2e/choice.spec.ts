import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import {
  accessibilityFaults,
  keepPicture,
  openBrowser,
  openPage,
  type Screen,
  signIn,
} from '../support/browser.ts';
import { Product } from '../support/product.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';
const SCREENS = [1280, 320].flatMap((width) =>
  (['paper', 'walnut'] as const).map((theme) => [width, theme] as const),
);

describe('choosing an IF, a cure and an hour', () => {
  const product = new Product();
  let browser: Browser;
  let page: Page;
  let address = '';

  const member = () =>
    product.signIns.find(({ role }) => role === 'member') ?? expect.fail('There is no member.');
  const query = () => new URL(page.url()).searchParams;
  const marker = () => page.getByRole('slider', { name: /IF/ });
  const heading = (name: string, of = page) => of.getByRole('heading', { name, exact: true });

  /** Sections below come when they are scrolled to. */
  const scrollTo = async (name: string, of = page) => {
    const isThere = async () => {
      await of.mouse.wheel(0, 600);
      return heading(name, of).isVisible();
    };
    await expect.poll(isThere, { timeout: 20_000 }).toBe(true);
  };

  beforeAll(async () => {
    await product.start();
    browser = await openBrowser();
    page = await openPage(browser, product.url);
    await signIn(page, member());
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await marker().waitFor();
    await page
      .getByRole('button', { name: /^Put .* on trial$/ })
      .first()
      .waitFor();
  });

  afterAll(async () => {
    await browser.close();
    await product.remove();
  });

  it('moves the IF into a guard band by keyboard alone, and says how it must be kept', async () => {
    await marker().focus();
    for (let step = 0; step < 10; step++) await page.keyboard.press('ArrowLeft');
    await expect.poll(() => query().get('if')).toBe('555000');

    await expect
      .poll(() => page.locator('app-holding').innerText())
      .toMatch(/The choice holds from 5\d\d.* to 55\d.* kHz.*must keep within ±/s);
    await page.getByText('555 kHz by day and by night').waitFor();
  });

  it('puts a cure on trial in one press, and undoes it', async () => {
    await scrollTo('What would cure it');
    const put = page.getByRole('button', { name: /^Put on trial.*one more tuned circuit/i });
    await put.click();
    await expect.poll(() => query().get('set')).toContain('circuits');
    expect(query().get('if')).toBeNull();

    await page
      .getByRole('region', { name: 'On trial' })
      .getByText(/not saved/)
      .waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect.poll(() => query().get('set')).toBeNull();
    expect(query().get('if')).toBe('555000');
  });

  it('sorts the candidates, in the address, so that back goes back', async () => {
    await page.getByRole('button', { name: /Worst image/ }).click();
    await expect.poll(() => query().get('sort')).toBe('image-asc');
    await page.goBack();
    await expect.poll(() => query().get('sort')).toBeNull();
  });

  it('shows the hours of a day, and judges the page at one of them', async () => {
    await scrollTo('Through the day');
    await page.getByLabel('Day', { exact: true }).last().fill('2026-12-21');
    await expect.poll(() => query().get('date')).toBe('2026-12-21');
    const strip = page.locator('app-hours-strip').getByRole('application');
    await strip.waitFor();
    await strip.press('Home');
    await page.getByRole('button', { name: 'Judge the page at 00:00 UTC' }).click();

    await expect.poll(() => query().get('at')).toBe('2026-12-21T00:00:00.000Z');
    await page.getByText('Judged at 2026-12-21 00:00 UTC').waitFor();
    address = page.url();
  });

  it('asks for one IF that serves a further site, and says what each site says', async () => {
    await scrollTo('One IF for several sites');
    await page.getByRole('combobox', { name: 'Further site' }).click();
    await page.getByRole('option').last().click();
    await page.getByRole('button', { name: 'Add this site' }).click();

    await expect.poll(() => query().get('also')).toMatch(/^\d+\.[ae]/);
    await page.getByRole('button', { name: /^Leave out/ }).waitFor();
    await expect
      .poll(() => page.locator('.saying').innerText())
      .toMatch(/over 2 sites|^Leave it where it is/);
  });

  it('loses nothing when the session ends in the middle', async () => {
    await page.goto(address);
    await marker().waitFor();
    const cookies = await page.context().cookies();
    await page.context().clearCookies();
    await page.context().addCookies(cookies.filter(({ httpOnly }) => !httpOnly));
    const box = page.getByRole('textbox', { name: 'IF on trial' });
    await box.fill('553.5');
    await box.press('Enter');
    await expect.poll(() => query().get('if')).toBe('553500');

    const renewal = page.getByRole('dialog', { name: 'Your session has ended' });
    await renewal.getByLabel('Password').fill(member().password);
    await renewal.getByRole('button', { name: 'Sign in' }).click();
    await renewal.waitFor({ state: 'detached' });
    expect(await box.inputValue()).toBe('553.5');

    await page.getByRole('button', { name: 'Try again' }).first().click();
    await page.getByText('553.5 kHz by day and by night').waitFor();
  });

  it.each(SCREENS)('is readable for everyone at %i, %s', async (width, theme) => {
    const screen: Screen = { width, height: 900, scheme: 'light' };
    const viewer = await openPage(browser, product.url, screen);
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    await signIn(viewer, member());
    const { pathname, search } = new URL(address);
    await viewer.goto(pathname + search);
    for (const name of ['What would cure it', 'Through the day', 'One IF for several sites']) {
      await scrollTo(name, viewer);
    }
    await viewer.locator('app-day-strip').waitFor();

    const overflow = () =>
      viewer.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
    await expect.poll(overflow).toBeLessThanOrEqual(0);
    await keepPicture(viewer, `choice-${width}-${theme}`);
    expect(await accessibilityFaults(viewer)).toEqual([]);
    await viewer.context().close();
  });
});
