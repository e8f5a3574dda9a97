import { ComponentHarness } from '@angular/cdk/testing';

/** The table of a chart's rows. */
export class TwinTableHarness extends ComponentHarness {
  static hostSelector = 'app-twin-table';

  private readonly names = this.locatorForAll('tbody button');
  private readonly cells = this.locatorForAll('tbody td');
  private readonly current = this.locatorForOptional('tr[aria-current] button');

  async rowNames(): Promise<string[]> {
    return Promise.all((await this.names()).map((each) => each.text()));
  }

  async cellTexts(): Promise<string[]> {
    return Promise.all((await this.cells()).map((each) => each.text()));
  }

  async pick(name: string): Promise<void> {
    const names = await this.rowNames();
    await (await this.names())[names.indexOf(name)]?.click();
  }

  async pickedName(): Promise<string | undefined> {
    return (await this.current())?.text();
  }
}
