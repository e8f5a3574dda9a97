import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

import axe, { type AxeResults } from 'axe-core';
import { type Browser, chromium, type Page } from 'playwright-core';

import { CHROMIUM, findProgram } from '../../server/dev/programs.ts';

const SCREENSHOTS = resolve(fileURLToPath(new URL('../../.screenshots', import.meta.url)));

/** Axe's names for WCAG 2.2, levels A and AA. */
const CONFORMANCE = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

export interface Screen {
  readonly width: number;
  readonly height: number;
  readonly scheme: 'light' | 'dark';
}

export const DESK: Screen = { width: 1280, height: 800, scheme: 'light' };
export const PHONE: Screen = { width: 390, height: 844, scheme: 'light' };

/** Debian's Chromium, without a window. Close it in `afterAll`. */
export function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: findProgram(CHROMIUM.program) ?? CHROMIUM.program,
    args: ['--no-sandbox', '--disable-dev-shm-usage'],
  });
}

/** A page of a visitor nobody knows yet: a context of its own, without cookies. */
export async function openPage(browser: Browser, baseURL: string, screen = DESK): Promise<Page> {
  const context = await browser.newContext({
    baseURL,
    viewport: { width: screen.width, height: screen.height },
    colorScheme: screen.scheme,
    reducedMotion: 'reduce',
  });
  context.setDefaultTimeout(30_000);
  return context.newPage();
}

/** Signs in through the page, as a person does. */
export async function signIn(
  page: Page,
  { email, password }: { readonly email: string; readonly password: string },
): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

/** What axe finds against WCAG 2.2 A and AA on the page as it stands; empty when all is well. */
export async function accessibilityFaults(page: Page): Promise<readonly string[]> {
  // What is being computed anew is dimmed, too faint to be read for good.
  await page.waitForFunction(
    () => document.querySelector('[aria-busy="true"], .stale, .awaited') === null,
  );
  await page.waitForTimeout(200); // The light comes back within 150 ms.
  await page.evaluate(axe.source);
  const { violations } = await page.evaluate<AxeResults>(
    `axe.run({ runOnly: ${JSON.stringify(CONFORMANCE)} })`,
  );
  return violations.map(
    ({ id, help, nodes }) => `${id}: ${help} (${nodes.map(({ html }) => html).join(' | ')})`,
  );
}

/** Keeps a picture in the ignored folder `.screenshots`, to be looked at. */
export async function keepPicture(page: Page, name: string): Promise<void> {
  mkdirSync(SCREENSHOTS, { recursive: true });
  await page.screenshot({ path: join(SCREENSHOTS, `${name}.png`), fullPage: true });
}
