import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatPaginatorHarness } from '@angular/material/paginator/testing';
import { MatTableHarness } from '@angular/material/table/testing';

/** The page of an edition as a person works with it. */
export class EditionPageHarness extends ComponentHarness {
  static readonly hostSelector = 'app-edition-page';

  readonly paginator = this.locatorFor(MatPaginatorHarness);

  private readonly table = this.locatorForOptional(MatTableHarness);

  /** Texts of the rows; empty where there is no table. */
  async rows(): Promise<string[][]> {
    return (await (await this.table())?.getCellTextByIndex()) ?? [];
  }

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async search(text: string): Promise<void> {
    await (await this.locatorFor(MatInputHarness)()).setValue(text);
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }
}
