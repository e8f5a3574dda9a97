import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import {
  accessibilityFaults,
  DESK,
  keepPicture,
  openBrowser,
  openPage,
  PHONE,
  signIn,
} from '../support/browser.ts';
import { accountOf, ImportJourney } from '../support/import-journey.ts';

const REGION = 'Marram Coast';
const SITE = /Zelmere/;
const SCREENS = [
  ['1280-paper', DESK, 'paper'],
  ['1280-walnut', DESK, 'walnut'],
  ['320-paper', { ...PHONE, width: 320 }, 'paper'],
  ['320-walnut', { ...PHONE, width: 320 }, 'walnut'],
] as const;

const HEADER = 'name,call sign,frequency kHz,latitude,longitude,power by day kW,power by night kW';
const BEFORE = [
  HEADER,
  'Low Sand,QMG,603,34.2,-56,0.5,0.5',
  'Marram Head,QMA,612,33.6,-55.0,50,50',
  'Sandling,QMB,738,33.9,-54.6,20,20',
  'Oyster Bank,QMC,1017,33.2,-55.4,10,10',
  'Far Light,QMD,1341,34.2,-56,5,1',
].join('\n');
/** Strong newcomers close by on the intermediate frequencies; one gone, one moved, one weaker. */
const AFTER = [
  HEADER,
  'Low Sand,QMG,603,34.2,-56,0.5,0.5',
  'Marram Head,QMA,612,33.6,-55.0,50,50',
  'Sandling,QMB,738,33.9,-54.6,10,20',
  'Oyster Bank,QMC,1017,33.2,-55.9,10,10',
  'Quay Beacon,QME,455,33.55,-55.05,100,100',
  'Quay Light,QMF,560,33.55,-55.05,100,100',
].join('\n');

describe('editions of a list', () => {
  let browser: Browser;
  let page: Page;
  let region = '';
  let first = '';
  let second = '';

  const heading = (name: string | RegExp) => page.getByRole('heading', { name });
  const press = (name: string) => page.getByRole('button', { name, exact: true }).click();
  const choose = async (field: string, option: RegExp) => {
    await page.getByRole('combobox', { name: field }).press('Enter');
    await page.getByRole('option', { name: option }).click();
  };

  /** Imports a list from the page of the region and answers the address of its edition. */
  const take = async (journey: ImportJourney, label: string, content: string): Promise<string> => {
    await journey.choose(`${label}.csv`, content);
    await journey.check();
    await journey.store(label);
    await journey.openEdition(label);
    return new URL(page.url()).pathname;
  };

  const listOf = async (viewer: Page, corrections: 'none' | 'applied'): Promise<string> =>
    (await viewer.request.get(`/api${second}/stations.csv?corrections=${corrections}`)).text();

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    await signIn(page, accountOf('librarian'));
    const journey = new ImportJourney(page);
    await journey.beginRegion(REGION);
    region = new URL(page.url()).pathname;
    first = await take(journey, 'Winter list', BEFORE);
    await page.goto(region);
    second = await take(journey, 'Summer list', AFTER);
  });

  afterAll(() => browser.close());

  it('are filtered at a site and sorted, all of it in the address', async () => {
    await page.goto(second);
    await choose('Heard from site', SITE);
    await page.getByLabel('From', { exact: true }).fill('0.6 MHz');
    await page.getByRole('button', { name: 'dB(µV/m)' }).click();
    await page.getByText('4 stations, strongest first').waitFor();

    const address = new URL(page.url());
    expect(Object.fromEntries(address.searchParams)).toMatchObject({
      fromHz: '600000',
      sort: 'field',
      direction: 'desc',
    });
    await page.reload();
    await page.getByText('4 stations, strongest first').waitFor();
  });

  it('are gone through on the map by keys, as in the table', async () => {
    await page.goto(second);
    const map = page.getByRole('application', { name: /^Map/ });
    await map.focus();
    await page.keyboard.press('Home');
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('End');

    const chosen = page.locator('tr[aria-current]');
    await chosen.waitFor();
    expect(await chosen.count()).toBe(1);
    const across = page.getByLabel('across');
    const before = await across.inputValue();
    await map.focus();
    await page.keyboard.press('+');
    await expect.poll(async () => Number(await across.inputValue())).toBeLessThan(Number(before));
    await page.keyboard.press('0');
    await expect.poll(() => across.inputValue()).toBe(before);
    await page.keyboard.press('Enter');
    await heading(/kHz$/).waitFor();
    await page.goBack();
  });

  it('differ by what was added, gone, moved and changed in power', async () => {
    await page.goto(`${second}/differences`);
    const kinds = page.getByRole('navigation', { name: 'Kinds of difference' });

    await kinds.getByRole('link', { name: 'Added 2' }).waitFor();
    for (const kind of ['Gone 1', 'Moved 1', 'Changed power 1']) {
      await kinds.getByRole('link', { name: kind }).waitFor();
    }
    await kinds.getByRole('link', { name: 'Changed power 1' }).click();
    await page.getByRole('row', { name: /Sandling.*20 kW.*10 kW.*−3\.0 dB/ }).waitFor();
    await kinds.getByRole('link', { name: 'All' }).click();
  });

  it('change verdicts of receivers, with the sentence before and after', async () => {
    await choose('Site', SITE);
    await page.getByText(/receivers? judged\./).waitFor({ timeout: 60_000 });

    const changed = page.locator('app-verdict-changes .changed > li');
    expect(await changed.count()).toBeGreaterThan(0);
    const words = await changed.first().innerText();
    expect(words).toMatch(/Before.*harms none of them.*After.*harms \d+ of them/s);
    expect(words).toMatch(/Because.*Quay Light on 560\skHz \(added\)/s);
    const link = changed.first().getByRole('link').first();
    expect(await link.getAttribute('href')).toContain(`edition=${second.split('/').at(-1)}`);
  });

  it('are corrected by ear, and stay as they were imported', async () => {
    const member = await openPage(browser, inject('productUrl'));
    await signIn(member, accountOf('member'));
    const imported = await listOf(member, 'none');
    await member.goto(second);
    await member.getByRole('link', { name: 'Marram Head' }).click();
    await member.getByRole('radio', { name: 'Off the air' }).check();
    await member.getByLabel('Note', { exact: true }).fill('Silent all week');
    await member.getByRole('button', { name: 'Note it' }).click();
    await member.getByText(/receivers are judged as if it were not there/).waitFor();

    expect(await listOf(member, 'none')).toBe(imported);
    expect(await listOf(member, 'applied')).not.toContain('Marram Head');
    await member.goto(`${second}?only=corrected`);
    await member.getByRole('row', { name: /Marram Head.*off the air.*Silent all week/ }).waitFor();
    await member.goto(`${second}?corrections=none`);
    await member.getByText('6 stations, lowest frequency first').waitFor();
    expect(await member.getByText('Silent all week').count()).toBe(0);
    await member.context().close();
  });

  it('take a station of which the list lacks, kept apart and taken back', async () => {
    await page.goto(second);
    await page.getByRole('link', { name: 'Add a station' }).click();
    await press('Save the station');
    await page
      .getByRole('alert')
      .getByText(/Give a frequency/)
      .waitFor();
    await page.getByLabel('Name', { exact: true }).fill('Harbour Beacon');
    await page.getByLabel('Frequency').fill('0,405 MHz');
    await page.getByLabel('Locator, or both coordinates at once').fill('33.4 N 55.2 W');
    await page.getByLabel('Power by day').fill('50 W');
    await press('Save the station');
    await page.getByRole('row', { name: /405 Harbour Beacon.*50 W.*added by hand/ }).waitFor();
    await page.goto(first);
    await page.getByRole('link', { name: 'Harbour Beacon' }).click();
    await press('Take back');
    await page.getByRole('alertdialog').getByRole('button', { name: 'Take it back' }).click();
    await page.getByText('5 stations, lowest frequency first').waitFor();
  });

  it.each(SCREENS)('are readable for everyone at %s', async (name, screen, theme) => {
    const viewer = await openPage(browser, inject('productUrl'), screen);
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    await signIn(viewer, accountOf('librarian'));
    await viewer.goto(second);
    await viewer.getByRole('link', { name: 'Sandling' }).click();
    await viewer.getByRole('heading', { name: /Sandling/ }).waitFor();
    const station = new URL(viewer.url()).pathname;
    const pages = {
      edition: second,
      change: `${second}/change`,
      differences: `${second}/differences`,
      newcomer: `${second}/stations/new`,
      station,
      region,
    };
    for (const [part, address] of Object.entries(pages)) {
      await viewer.goto(address);
      await viewer.waitForLoadState('networkidle');
      const overflow = await viewer.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      await keepPicture(viewer, `editions-${part}-${name}`);
      expect(await accessibilityFaults(viewer), part).toEqual([]);
      expect(overflow, part).toBeLessThanOrEqual(0);
    }
    await viewer.context().close();
  });
});
