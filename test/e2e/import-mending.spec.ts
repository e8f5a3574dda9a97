import { readFileSync } from 'node:fs';

import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import {
  accessibilityFaults,
  keepPicture,
  openBrowser,
  openPage,
  signIn,
} from '../support/browser.ts';
import { accountOf, ImportJourney } from '../support/import-journey.ts';

const REGION = 'Saltmarsh';
const GOOD = 63;
const BAD = 37;

/** Somebody typed the letter O for a leading nought in every frequency of a page. */
const LIST = [
  'Name;Frequency (kHz);Latitude;Longitude;Power (kW)',
  ...Array.from({ length: GOOD + BAD }, (_, index) => {
    const frequency = String(603 + 9 * (index % 10));
    const typed = index < GOOD ? frequency : `O${frequency}`;
    return `Mast ${index};${typed};${47 + index / 100};${8 + index / 100};1`;
  }),
].join('\n');

describe('mending a list through its rejected rows', () => {
  let browser: Browser;
  let page: Page;
  let journey: ImportJourney;
  let rejects = '';
  let rejectsName = '';

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    await signIn(page, accountOf('librarian'));
    journey = new ImportJourney(page);
    await journey.beginRegion(REGION);
  });

  afterAll(() => browser.close());

  it('tells the 37 rows as one cause', async () => {
    await journey.choose('saltmarsh.csv', LIST);
    await journey.check();

    await page
      .getByText(`${GOOD} of ${GOOD + BAD} rows can be stored; ${BAD} are rejected.`)
      .waitFor();
    await page.getByText(/^Frequency \(kHz\): expected is a frequency in kHz/).waitFor();
    expect(await page.getByRole('row', { name: /^\d+ O\d+$/ }).count()).toBe(BAD);
  });

  it('stores the good rows and hands out the others with their reasons', async () => {
    await journey.store('Marsh list');
    await journey.heading('Stored').waitFor();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Download the rejected rows' }).click(),
    ]);
    rejectsName = download.suggestedFilename();
    rejects = readFileSync(await download.path(), 'utf8');

    const lines = rejects.trim().split(/\r?\n/);
    expect(lines).toHaveLength(1 + BAD);
    expect(lines[1]).toMatch(/a frequency in kHz/);
  });

  it('offers to complete the edition by the mended rows', async () => {
    await page.getByRole('link', { name: REGION }).click();
    await journey.choose(rejectsName, rejects.replace(/\bO(?=\d)/g, ''));

    const completes = page.getByRole('radio', { name: /They complete Marsh list/ });
    expect(await completes.isChecked()).toBe(true);
    expect(await accessibilityFaults(page)).toEqual([]);
    await keepPicture(page, 'import-completes-1280-paper');
    await journey.check();
    await page.getByText('Every row can be stored.').waitFor();
    await page.getByText(`its other ${GOOD} stations stay as they are`).waitFor();
    await keepPicture(page, 'import-mended-1280-paper');
  });

  it('has the whole list in the end', async () => {
    await journey.store('Marsh list, mended');
    await journey.openEdition('Marsh list, mended');

    await page.getByText(`${GOOD + BAD} stations, lowest frequency first`).waitFor();
    await page.getByLabel('Find by name, call sign or frequency').fill('Mast 99');
    await page.getByRole('row', { name: /684 Mast 99/ }).waitFor();
  });
});
