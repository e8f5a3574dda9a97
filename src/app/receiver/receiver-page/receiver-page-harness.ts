import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';

/** A receiver's page as its reader meets it. */
export class ReceiverPageHarness extends ComponentHarness {
  static hostSelector = 'app-receiver-page';

  private readonly heading = this.locatorForOptional('h1');
  private readonly invitation = this.locatorForOptional('app-site-invitation');
  private readonly advice = this.locatorForOptional('.saying');
  private readonly alerts = this.locatorForAll('[role="alert"]');
  private readonly assumed = this.locatorForOptional('.assumed');

  async title(): Promise<string | undefined> {
    return (await this.heading())?.text();
  }

  async isSiteAskedFor(): Promise<boolean> {
    return (await this.invitation()) !== null;
  }

  async adviceText(): Promise<string | undefined> {
    return (await this.advice())?.text();
  }

  async assumptionText(): Promise<string | undefined> {
    return (await this.assumed())?.text();
  }

  async alertTexts(): Promise<string[]> {
    const texts = await Promise.all((await this.alerts()).map((each) => each.text()));
    return texts.filter((text) => text !== '');
  }

  async press(text: string | RegExp): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }
}
