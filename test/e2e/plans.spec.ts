import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import {
  accessibilityFaults,
  DESK,
  keepPicture,
  openBrowser,
  openPage,
  PHONE,
  type Screen,
  signIn,
} from '../support/browser.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';
const GUARDED = 'Into the guard band';
const SCREENED = 'Better screened';
const AS_IT_IS = 'Left where it is';
const NARROW: Screen = { width: 320, height: 800, scheme: 'light' };
const SCREENS = [
  ['1280-paper', DESK, 'paper'],
  ['1280-walnut', DESK, 'walnut'],
  ['390-paper', PHONE, 'paper'],
  ['390-walnut', PHONE, 'walnut'],
  ['320-paper', NARROW, 'paper'],
  ['320-walnut', NARROW, 'walnut'],
] as const;

describe('plans', () => {
  let browser: Browser;
  let page: Page;
  let link = '';
  /** Addresses of plan, list, comparison, by name; filled on the way. */
  const addresses = new Map<string, string>();

  const member = () => {
    const found = inject('demoSignIns').find(({ role }) => role === 'member');
    if (!found) throw new Error('The demo club has no member.');
    return found;
  };

  const choose = async (field: string, option: RegExp) => {
    await page.getByRole('combobox', { name: field }).click();
    await page.getByRole('option', { name: option }).click();
  };

  const keep = async (name: string, note: string) => {
    await page.getByRole('button', { name: 'Keep this plan' }).click();
    await page.getByLabel('Name of the plan').fill(name);
    await page.getByLabel('Note').fill(note);
    await page.getByRole('button', { name: 'Keep the plan' }).click();
    await page.getByRole('link', { name: 'Open the plan' }).waitFor();
  };

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    await signIn(page, member());
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await choose('Site', /Zelmere/);
    await choose('Stations', /Quorrel/);
    await page.getByRole('radio', { name: 'Night' }).click();
  });

  afterAll(() => browser.close());

  it('keep the IF as it is and moved into a guard band, each with a note', async () => {
    await page.getByRole('button', { name: /^Put .* on trial$/ }).waitFor();
    await keep(AS_IT_IS, 'Before anything is touched.');

    await page.getByRole('button', { name: /^Put .* on trial$/ }).click();
    await expect.poll(() => page.url()).toMatch(/if=55[3-7]\d{3}/);
    await keep(GUARDED, 'Retune the BFO.');
    await page.getByRole('link', { name: 'Open the plan' }).click();

    await page.getByRole('heading', { name: GUARDED }).waitFor();
    await page.getByText('Retune the BFO.').waitFor();
    addresses.set('plan', page.url());
  });

  it('say by name what is heard and show the working of it', async () => {
    const working = page.getByRole('button', { name: 'Show the working' }).first();
    await working.click();

    const ledger = page.getByRole('dialog');
    await ledger.getByText('Wanted to unwanted').waitFor();
    await page.keyboard.press('Escape');
    await ledger.waitFor({ state: 'detached' });
    expect(await page.getByText('a station', { exact: true }).count()).toBe(0);
  });

  it('come from a set-up on trial as well: undone, redone, reloaded, kept and dropped', async () => {
    await page.getByRole('link', { name: 'Put on trial again' }).click();
    await page.getByRole('tab', { name: 'Set-up on trial' }).click();
    addresses.set('trial', page.url());
    const stray = page.getByRole('textbox', { name: 'stray pick-up, at the IF' });
    const saved = await stray.inputValue();
    const changed = page.getByText(/On trial, not saved: 1 field/);

    await stray.fill('91 dB');
    await stray.press('Enter');
    await changed.waitFor();
    await page.getByRole('heading', { name: 'The set-up on trial' }).click();
    await page.keyboard.press('Control+z');
    await expect.poll(() => stray.inputValue()).toBe(saved);
    await page.getByRole('button', { name: 'Redo' }).click();
    await expect.poll(() => stray.inputValue()).toBe('91');
    await page.reload();
    await expect.poll(() => stray.inputValue()).toBe('91');
    addresses.set('trial', page.url());

    await page.getByRole('button', { name: 'Keep as a plan' }).click();
    await page.getByLabel('Name of the plan').fill(SCREENED);
    await page.getByRole('button', { name: 'Keep the plan' }).click();
    await page.getByRole('link', { name: 'Open the plan' }).waitFor();
    await page.getByRole('button', { name: 'Drop the trial' }).click();
    await expect.poll(() => stray.inputValue()).toBe(saved);
    await page.getByRole('link', { name: 'Open the plan' }).click();
    await page.getByRole('heading', { name: 'Set-up on trial' }).waitFor();
    expect(await page.getByRole('row', { name: /stray pick-up, at the IF/ }).innerText()).toContain(
      '91',
    );
  });

  it('are compared: what got better, what worse, in words and marks', async () => {
    await page.getByRole('link', { name: 'All plans' }).click();
    await page.getByRole('checkbox').first().waitFor();
    addresses.set('list', page.url());
    await page.getByRole('checkbox', { name: `Choose ${GUARDED} to compare` }).check();
    await page.getByRole('checkbox', { name: `Choose ${AS_IT_IS} to compare` }).check();
    await page.getByRole('button', { name: 'Compare the two chosen' }).click();

    const row = (name: string) => page.getByRole('row', { name: new RegExp(`^${name}`) });
    await expect.poll(() => row('Left to be desired').innerText()).toContain('better');
    expect(await row('BFO moves').innerText()).toContain('worse');
    await page.getByText('Both were judged with the same set-up, but for the IF.').waitFor();
    addresses.set('comparison', page.url());
  });

  it('are read by a link signed out, until it is ended', async () => {
    await page.goto(addresses.get('plan') ?? '');
    await page.getByRole('button', { name: 'Share by a link' }).click();
    link = await page.getByRole('textbox', { name: 'Link to this plan' }).inputValue();
    const visitor = await openPage(browser, inject('productUrl'));

    const answer = await visitor.goto(link);
    await visitor.getByRole('heading', { name: GUARDED }).waitFor();
    await visitor.getByText(/Read only: shared by/).waitFor();
    await visitor.getByRole('heading', { name: 'The dial' }).waitFor();
    expect(answer?.headers()['referrer-policy']).toBe('no-referrer');
    expect(answer?.headers()['x-robots-tag']).toContain('noindex');
    await visitor.context().close();
  });

  it.each(SCREENS)('are readable for everyone at %s', async (name, screen, theme) => {
    const viewer = await openPage(browser, inject('productUrl'), screen);
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    const look = async (what: string, address: string, heading: string) => {
      await viewer.goto(address);
      await viewer.getByRole('heading', { name: heading }).first().waitFor();
      const overflow = () =>
        viewer.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
      await expect.poll(overflow, { message: what }).toBeLessThanOrEqual(0);
      await keepPicture(viewer, `${what}-${name}`);
      expect(await accessibilityFaults(viewer), what).toEqual([]);
    };

    await look('shared-plan', link, 'The dial');
    await signIn(viewer, member());
    await look('plan', addresses.get('plan') ?? '', 'The dial');
    await look('plans', addresses.get('list') ?? '', GUARDED);
    await look('set-up-trial', addresses.get('trial') ?? '', 'The set-up on trial');
    await look('plans-compared', addresses.get('comparison') ?? '', 'Every term');
    await viewer.context().close();
  });

  it('are no longer read once the link is ended', async () => {
    await page.getByRole('button', { name: 'End the link' }).click();
    await page.getByText(/^The link has ended/).waitFor();
    const visitor = await openPage(browser, inject('productUrl'));

    await visitor.goto(link);

    await visitor.getByRole('heading', { name: 'Nothing is shared here' }).waitFor();
    await visitor.context().close();
  });
});
