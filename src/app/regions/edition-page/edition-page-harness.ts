import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatPaginatorHarness } from '@angular/material/paginator/testing';
import { MatSelectHarness } from '@angular/material/select/testing';
import { MatSortHarness } from '@angular/material/sort/testing';
import { MatTableHarness } from '@angular/material/table/testing';

/** The page of an edition as a person works with it. */
export class EditionPageHarness extends ComponentHarness {
  static readonly hostSelector = 'app-edition-page';

  readonly paginator = this.locatorFor(MatPaginatorHarness);

  private readonly table = this.locatorForOptional(MatTableHarness);
  private readonly map = this.locatorFor('app-map-surface [role="application"]');
  private readonly current = this.locatorForAll('tr[aria-current]');

  /** Texts of the rows; empty where there is no table. */
  async rows(): Promise<string[][]> {
    return (await (await this.table())?.getCellTextByIndex()) ?? [];
  }

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async search(text: string): Promise<void> {
    const box = await this.locatorFor(MatInputHarness.with({ selector: '[type=search]' }))();
    await box.setValue(text);
  }

  /** Types into a field of the filter. */
  async type(label: string, text: string): Promise<void> {
    const box = await this.locatorFor(MatInputHarness.with({ label }))();
    await box.setValue(text);
    await box.blur();
  }

  async choose(label: string, option: string): Promise<void> {
    const select = await this.locatorFor(MatSelectHarness.with({ label }))();
    await select.clickOptions({ text: option });
  }

  async sortBy(label: string): Promise<void> {
    const sort = await this.locatorFor(MatSortHarness)();
    const [head] = await sort.getSortHeaders({ label });
    await head?.click();
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }

  /** Presses keys while the map has the focus. */
  async keyOnMap(...keys: string[]): Promise<void> {
    const map = await this.map();
    await map.focus();
    for (const key of keys) await map.dispatchEvent('keydown', { key });
  }

  /** Text of the rows that are chosen. */
  async chosen(): Promise<string[]> {
    return Promise.all((await this.current()).map((row) => row.text()));
  }
}
