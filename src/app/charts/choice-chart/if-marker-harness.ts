import { ComponentHarness, type ModifierKeys, type TestKey } from '@angular/cdk/testing';

/** The marker of the IF on trial. */
export class IfMarkerHarness extends ComponentHarness {
  static hostSelector = 'app-if-marker';

  async value(): Promise<string | null> {
    return (await this.host()).getAttribute('aria-valuetext');
  }

  async press(key: TestKey, modifiers: ModifierKeys = {}): Promise<void> {
    const host = await this.host();
    await host.focus();
    await host.sendKeys(modifiers, key);
  }
}
