import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import { openBrowser, openPage, signIn } from '../support/browser.ts';
import { accountOf, ImportJourney } from '../support/import-journey.ts';
import { cleanList, HEADER } from '../support/lists.ts';

/** Enough for a person, and a reload, to come in between. */
const MANY = 100_000;

const FORMULA = '=HYPERLINK("http://lakes.example","Lake")';
const ODD = `${HEADER}\n"${FORMULA.replaceAll('"', '""')}",612,47.31,8.05,50,10\n@SUM(1),621,47.9,8.4,1.5,0`;

describe('storing a list', () => {
  let browser: Browser;
  let page: Page;
  let journey: ImportJourney;

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    page.setDefaultTimeout(90_000);
    await signIn(page, accountOf('librarian'));
    journey = new ImportJourney(page);
  });

  afterAll(() => browser.close());

  it('takes a clean file without a question', async () => {
    await journey.beginRegion('Clearwater');
    await journey.choose('clearwater.csv', cleanList(120));
    expect(await page.getByText('not said in the file').count()).toBe(0);
    await journey.check();
    await page.getByText('Every row can be stored.').waitFor();
    await journey.store('Clear list');
    await journey.openEdition('Clear list');

    await page.getByText('120 stations, lowest frequency first').waitFor();
  });

  it('shows a formula as the text it is', async () => {
    await journey.beginRegion('Formula Fen');
    await journey.choose('fen.csv', ODD);
    await page.getByRole('cell', { name: FORMULA }).waitFor();
    await journey.check();
    await journey.store('Fen list');
    await journey.openEdition('Fen list');

    await page.getByRole('row', { name: FORMULA }).waitFor();
    await page.getByRole('row', { name: '@SUM(1)' }).waitFor();
    expect(await page.locator('a[href*="lakes.example"]').count()).toBe(0);
  });

  it('can be cancelled while it is under way, and leaves nothing behind', async () => {
    await journey.beginRegion('Wide Fen');
    await journey.choose('wide.csv', cleanList(MANY));
    await journey.check();
    await journey.store('Wide list');
    await journey.heading('Storing the edition').waitFor();
    await journey.press('Cancel');
    await journey.heading('Cancelled').waitFor();

    await page.getByRole('link', { name: 'Back to the region' }).click();
    await page.getByText('No edition yet').waitFor();
  });

  it('goes on while the page is reloaded, which shows how far it is', async () => {
    await journey.choose('wide.csv', cleanList(MANY));
    await journey.check();
    await journey.store('Wide list');
    await journey.heading('Storing the edition').waitFor();

    await page.reload();

    await journey.heading('Storing the edition').waitFor();
    await page.getByRole('progressbar', { name: 'Storing the edition' }).waitFor();
    await journey.openEdition('Wide list');
    await page.getByText('100,000 stations, lowest frequency first').waitFor();
  });
});
