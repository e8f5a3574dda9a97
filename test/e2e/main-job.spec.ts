import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import {
  accessibilityFaults,
  DESK,
  keepPicture,
  openBrowser,
  openPage,
  PHONE,
  signIn,
} from '../support/browser.ts';
import { Product } from '../support/product.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';
const PLAN = 'Into the guard band';
const SCREENS = [
  ['1280-paper', DESK, 'paper'],
  ['1280-walnut', DESK, 'walnut'],
  ['390-paper', PHONE, 'paper'],
  ['390-walnut', PHONE, 'walnut'],
] as const;

describe('moving an IF off a channel and keeping the plan', () => {
  const product = new Product();
  let browser: Browser;
  let page: Page;
  let address = '';

  const memberOf = () => {
    const member = product.signIns.find(({ role }) => role === 'member');
    if (!member) throw new Error('The demo club has no member.');
    return member;
  };

  const choose = async (field: string, option: RegExp) => {
    await page.getByRole('combobox', { name: field }).click();
    await page.getByRole('option', { name: option }).click();
  };

  const advice = () => page.getByText(/^560 is on a channel here/);
  const follow = () => page.getByRole('button', { name: /^Put .* on trial$/ });
  const trial = () => page.getByRole('textbox', { name: 'IF on trial' });

  beforeAll(async () => {
    await product.start();
    browser = await openBrowser();
    page = await openPage(browser, product.url);
    await signIn(page, memberOf());
  });

  afterAll(async () => {
    await browser.close();
    await product.remove();
  });

  it('opens a receiver of the demo club and advises a move for site, list and night', async () => {
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await choose('Site', /Zelmere/);
    await choose('Stations', /Quorrel/);
    await page.getByRole('radio', { name: 'Night' }).click();

    await follow().waitFor();
    expect(await advice().innerText()).toMatch(/\d+ dB less breakthrough by night/);
  });

  it('takes the IF on trial typed, by key and from the advice, and keeps it in the address', async () => {
    await trial().fill('0,556 MHz');
    await trial().press('Enter');
    await expect.poll(() => page.url()).toContain('if=556000');

    const marker = page.getByRole('slider', { name: /IF/ });
    await marker.press('ArrowLeft');
    await expect.poll(() => page.url()).not.toContain('if=556000');

    await page.goBack();
    await expect.poll(() => trial().inputValue()).toBe('556');

    await follow().click();
    await expect.poll(() => page.url()).toMatch(/if=55[3-7]\d{3}/);
    address = page.url();
  });

  it('says the same when the address is opened again', async () => {
    const before = await advice().innerText();

    await page.goto(address);
    await advice().waitFor();

    await expect.poll(() => advice().innerText()).toBe(before);
  });

  it('keeps the plan, which is there after a restart and a new sign-in', async () => {
    await page.getByRole('button', { name: 'Keep this plan' }).click();
    await page.getByLabel('Name of the plan').fill(PLAN);
    await page.getByRole('button', { name: 'Keep the plan' }).click();
    await page.getByRole('link', { name: 'Open the plan' }).click();
    await page.getByRole('heading', { name: PLAN }).waitFor();
    const kept = await page.getByRole('table').last().innerText();

    await product.stop();
    await product.start();
    page = await openPage(browser, product.url);
    await signIn(page, memberOf());
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await page.getByRole('link', { name: 'Plans' }).click();
    await page.getByRole('link', { name: PLAN }).click();
    await page.getByRole('heading', { name: PLAN }).waitFor();

    expect(await page.getByRole('table').last().innerText()).toBe(kept);
  });

  it.each(SCREENS)('is readable for everyone at %s', async (name, screen, theme) => {
    const viewer = await openPage(browser, product.url, screen);
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    await signIn(viewer, memberOf());
    const { pathname, search } = new URL(address);
    await viewer.goto(pathname + search);
    await viewer.getByRole('heading', { name: 'The choice of IF' }).waitFor();

    const overflow = () =>
      viewer.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
    await expect.poll(overflow).toBeLessThanOrEqual(0);
    await keepPicture(viewer, `receiver-${name}`);
    expect(await accessibilityFaults(viewer)).toEqual([]);
    await viewer.context().close();
  });
});
