import type { Page } from 'playwright-core';
import { inject } from 'vitest';

import type { Role } from '../../shared/contracts/session.ts';

/** Sign-in of the demo club's account of that role. */
export function accountOf(role: Role) {
  const account = inject('demoSignIns').find((each) => each.role === role);
  if (!account) throw new Error(`The demo club has no ${role}.`);
  return account;
}

/** The guided import as a librarian walks through it in the browser. */
export class ImportJourney {
  readonly page: Page;

  constructor(page: Page) {
    this.page = page;
  }

  heading(name: string) {
    return this.page.getByRole('heading', { name, exact: true });
  }

  press(name: string) {
    return this.page.getByRole('button', { name, exact: true }).click();
  }

  async beginRegion(name: string): Promise<void> {
    await this.page.goto('/regions/new');
    await this.page.getByLabel('Name').fill(name);
    await this.page.getByRole('combobox', { name: 'ITU Region' }).click();
    await this.page.getByRole('option', { name: /^1/ }).click();
    await this.press('Save the region');
    await this.heading(name).waitFor();
  }

  /** From the page of the region: chooses a file, which is read. */
  async choose(name: string, content: string | Buffer): Promise<void> {
    await this.page.getByRole('link', { name: 'Import a list' }).click();
    await this.page
      .getByLabel('List as CSV')
      .setInputFiles({ name, mimeType: 'text/csv', buffer: Buffer.from(content) });
    await this.heading('Say what the columns hold').waitFor();
  }

  async check(): Promise<void> {
    await this.press('Check every row');
    await this.heading('What was found, row by row').waitFor();
  }

  /** Begins to store what was checked. */
  async store(label: string): Promise<void> {
    await this.press('Go on to storing');
    await this.page.getByLabel('Name of the edition').fill(label);
    await this.press('Store the edition');
  }

  async openEdition(label: string): Promise<void> {
    await this.heading('Stored').waitFor();
    await this.page.getByRole('link', { name: 'Open the edition' }).click();
    await this.heading(label).waitFor();
  }
}
