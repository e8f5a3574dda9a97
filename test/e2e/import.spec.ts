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
import { accountOf } from '../support/import-journey.ts';

const REGION = 'Tidewater';
const SCREENS = [
  ['1280-paper', DESK, 'paper'],
  ['1280-walnut', DESK, 'walnut'],
  ['390-paper', PHONE, 'paper'],
  ['320-walnut', { ...PHONE, width: 320 }, 'walnut'],
] as const;

/** As a spreadsheet in central Europe saves it: the unit of one column is not said. */
const LIST = [
  'Sender;Frequenz;Breite;Länge;Leistung Tag (kW);Leistung Nacht (kW);Bemerkung',
  'Fährhafen;612;47,31;8,05;50;10;Küste',
  'Erlenrücken;621;47,9;8,4;1,5;0;',
  'Nordkai;6l2;47,1;8,2;1;1;',
  'Weiler;639;95;8,2;1;1;',
  'Grubental;643;;;;;ohne Ort',
  'Hochmoor;6ll;46,8;7,9;1;1;',
].join('\r\n');

const file = (name: string, content: Buffer) => ({ name, mimeType: 'text/csv', buffer: content });

describe('importing a list from a spreadsheet', () => {
  let browser: Browser;
  let page: Page;
  let address = '';

  const heading = (name: string) => page.getByRole('heading', { name, exact: true });
  const press = (name: string) => page.getByRole('button', { name, exact: true }).click();

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    await signIn(page, accountOf('librarian'));
  });

  afterAll(() => browser.close());

  it('begins with a region, whose raster is that of its ITU Region', async () => {
    await page.getByRole('link', { name: 'Regions' }).click();
    await page.getByRole('link', { name: 'New region' }).click();
    await page.getByLabel('Name').fill(REGION);
    await page.getByRole('combobox', { name: 'ITU Region' }).click();
    await page.getByRole('option', { name: /^1/ }).click();
    await press('Save the region');

    await heading(REGION).waitFor();
    await page.getByText('531–1602 kHz by 9 kHz').waitFor();
    await page.getByText('No edition yet').waitFor();
  });

  it('says what a file is that is no list', async () => {
    await page.getByRole('link', { name: 'Import a list' }).click();
    await page.getByLabel('List as CSV').setInputFiles(file('list.csv', Buffer.from('%PDF-1.7')));

    await page.getByRole('alert').getByText('PDF').waitFor();
  });

  it('reads the spelling of the file and asks for the one unit it does not say', async () => {
    await page
      .getByLabel('List as CSV')
      .setInputFiles(file('tidewater.csv', Buffer.from(LIST, 'latin1')));

    await page.getByText(/windows-1252, .* semicolons, with a decimal comma/i).waitFor();
    await page.getByRole('cell', { name: 'Fährhafen' }).waitFor();
    address = new URL(page.url()).pathname;
    await press('Check every row');
    await page.getByRole('alert').getByText('unit "Frequenz"').waitFor();
  });

  it.each(SCREENS)('is readable for everyone at %s', async (name, screen, theme) => {
    const viewer = await openPage(browser, inject('productUrl'), screen);
    await viewer.addInitScript((chosen) => {
      localStorage.setItem('fallow.theme', chosen);
    }, theme);
    await signIn(viewer, accountOf('librarian'));
    await viewer.goto(address);
    await viewer.getByRole('button', { name: 'Check every row' }).waitFor();

    const overflow = await viewer.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    await keepPicture(viewer, `import-${name}`);
    expect(await accessibilityFaults(viewer)).toEqual([]);
    expect(overflow).toBeLessThanOrEqual(0);
    await viewer.context().close();
  });

  it('shows the rejected rows by cause, and still does after a reload', async () => {
    await page.getByLabel('Unit of Frequenz').selectOption('kHz');
    await press('Check every row');
    const summary = page.getByText('3 of 6 rows can be stored; 3 are rejected.');
    await summary.waitFor();

    await page.reload();

    await summary.waitFor();
    await page.getByRole('cell', { name: '6ll' }).waitFor();
    expect(await page.getByRole('row', { name: /^4 6l2$/ }).count()).toBe(1);
    await page.getByText(/^Breite: expected is degrees/).waitFor();
    expect(await accessibilityFaults(page)).toEqual([]);
  });

  it('hands out the rejected rows with their reasons', async () => {
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Download the rejected rows' }).click(),
    ]);

    expect(download.suggestedFilename()).toMatch(/\.csv$/);
    expect(await download.failure()).toBeNull();
  });

  it('stores the good rows as an edition that can be searched', async () => {
    await press('Go on to storing');
    await page.getByLabel('Name of the edition').fill('Spring list');
    await press('Store the edition');
    await heading('Stored').waitFor();
    await page.getByRole('link', { name: 'Open the edition' }).click();

    await heading('Spring list').waitFor();
    await page.getByText('3 stations, lowest frequency first').waitFor();
    await page.getByRole('row', { name: /643 Grubental .*off the raster/ }).waitFor();
    await page.getByLabel('Find by name, call sign or frequency').fill('612');
    await page.getByText('One station for “612”').waitFor();
    await page.getByRole('row', { name: /612 Fährhafen .*50 kW 10 kW/ }).waitFor();
  });

  it('undoes the import as a whole', async () => {
    await page.goto(address);
    await press('Undo the import');
    await page.getByRole('alertdialog').getByRole('button', { name: 'Undo the import' }).click();
    await heading('Undone').waitFor();

    await page.getByRole('link', { name: REGION }).click();

    await page.getByText('No edition yet').waitFor();
  });

  it('tells a member who may import lists', async () => {
    const member = await openPage(browser, inject('productUrl'));
    await signIn(member, accountOf('member'));
    await member.goto(address.replace(/\/import\/.*/, ''));

    await member.getByText(/Only librarians and admins/).waitFor();
    expect(await member.getByRole('link', { name: 'Import a list' }).count()).toBe(0);
    await member.context().close();
  });
});
