import { ComponentHarness, type TestKey } from '@angular/cdk/testing';

/** A plot as its reader meets it: keys, readout, and what is said. */
export class PlotHarness extends ComponentHarness {
  static hostSelector = 'app-plot';

  private readonly surface = this.locatorFor('[role="application"]');
  private readonly readout = this.locatorForOptional('app-plot-readout');
  private readonly live = this.locatorFor('[aria-live]');
  private readonly labels = this.locatorForAll('app-plot-readout dt');
  private readonly values = this.locatorForAll('app-plot-readout dd');

  async name(): Promise<string | null> {
    return (await this.surface()).getAttribute('aria-label');
  }

  async press(...keys: (TestKey | string)[]): Promise<void> {
    const surface = await this.surface();
    await surface.focus();
    for (const key of keys) await surface.sendKeys(key);
  }

  async announcement(): Promise<string> {
    return (await this.live()).text();
  }

  async isReadoutShown(): Promise<boolean> {
    return (await this.readout()) !== null;
  }

  /** Lines of the readout, by label. */
  async lines(): Promise<Record<string, string>> {
    const labels = await Promise.all((await this.labels()).map((each) => each.text()));
    const values = await Promise.all((await this.values()).map((each) => each.text()));
    return Object.fromEntries(labels.map((label, at) => [label, values[at] ?? '']));
  }
}
