/** A chart of a page, as the journeys through all charts use it. */
import { readFileSync } from 'node:fs';

import type { Locator, Page } from 'playwright-core';

export interface ReadOut {
  readonly title: string;
  readonly lines: Readonly<Record<string, string>>;
}

export class ChartPage {
  readonly host: Locator;
  readonly surface: Locator;
  readonly readout: Locator;
  private readonly page: Page;

  constructor(page: Page, selector: string, index = 0) {
    this.page = page;
    this.host = page.locator(selector).nth(index);
    this.surface = this.host.getByRole('application');
    this.readout = this.host.locator('app-plot-readout');
  }

  /** What the readout says; null: none is shown. */
  async said(): Promise<ReadOut | null> {
    // The page draws what an event changed before the frame after.
    await this.page.evaluate(
      () => new Promise((done) => requestAnimationFrame(() => setTimeout(done))),
    );
    const [shown = null] = await this.readout.evaluateAll((all) =>
      all.map((each) => ({
        title: each.querySelector('.title')?.textContent.trim() ?? '',
        lines: Object.fromEntries(
          [...each.querySelectorAll('dt')].map((label) => [
            label.textContent.trim(),
            label.nextElementSibling?.textContent.trim() ?? '',
          ]),
        ),
      })),
    );
    return shown;
  }

  async press(key: string): Promise<ReadOut | null> {
    await this.surface.press(key);
    return this.said();
  }

  /** What the first marks say, from left to right. */
  async first(count: number): Promise<ReadOut[]> {
    const read: (ReadOut | null)[] = [await this.press('Home')];
    while (read.length < count) read.push(await this.press('ArrowRight'));
    return read.filter((each) => each !== null);
  }

  /** Where the mark that is read out stands, in the window. */
  async activeSpot(): Promise<{ x: number; y: number }> {
    const box = await this.host.locator('.active').boundingBox();
    if (!box) throw new Error('No mark is read out.');
    return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  }

  /** The limits as the head shows them, kilohertz. */
  async limits(): Promise<number[]> {
    const fields = this.host.locator('.limits input');
    return [Number(await fields.nth(0).inputValue()), Number(await fields.nth(1).inputValue())];
  }

  async limit(low: number, high: number): Promise<void> {
    const fields = this.host.locator('.limits input');
    await fields.nth(0).fill(String(low));
    await fields.nth(1).fill(String(high));
    await fields.nth(1).press('Enter');
  }

  button(name: string): Locator {
    return this.host.getByRole('button', { name, exact: true });
  }

  async save(kind: 'SVG' | 'PNG' | 'CSV'): Promise<Buffer> {
    await this.button('Save').click();
    const [file] = await Promise.all([
      this.page.waitForEvent('download'),
      this.page.getByRole('menuitem', { name: kind }).click(),
    ]);
    return readFileSync(await file.path());
  }

  /** Labels of the drawing that cover one another by more than a pixel. */
  overlaps(): Promise<string[]> {
    return this.host.locator('app-plot svg').evaluate((svg) => {
      const labels = [...svg.querySelectorAll('text')]
        .filter((each) => each.textContent.trim() !== '')
        .map((each) => ({ text: each.textContent.trim(), box: each.getBoundingClientRect() }))
        .filter(({ box }) => box.width > 0);
      return labels.flatMap((one, at) =>
        labels.slice(at + 1).flatMap((other) => {
          const wide =
            Math.min(one.box.right, other.box.right) - Math.max(one.box.left, other.box.left);
          // The box of a text is higher than its letters.
          const high =
            Math.min(one.box.bottom, other.box.bottom) - Math.max(one.box.top, other.box.top);
          return wide > 1 && high > 4 ? `${one.text} / ${other.text}` : [];
        }),
      );
    });
  }
}
