import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';

/** Reads the frame around the pages in specs. */
export class AppHarness extends ComponentHarness {
  static readonly hostSelector = 'app-root';

  private readonly navLinks = this.locatorForAll('nav a');
  private readonly allLinks = this.locatorForAll('header a');
  private readonly alerts = this.locatorForOptional('[role=alert]');
  private readonly again = this.locatorFor(MatButtonHarness.with({ text: 'Try again' }));
  private readonly skipLink = this.locatorFor('a[href="#content"]');

  async navigation(): Promise<string[]> {
    return Promise.all((await this.navLinks()).map((link) => link.text()));
  }

  async links(): Promise<string[]> {
    return Promise.all((await this.allLinks()).map((link) => link.text()));
  }

  async alert(): Promise<string | undefined> {
    return (await this.alerts())?.text();
  }

  async tryAgain(): Promise<void> {
    await (await this.again()).click();
  }

  async skip(): Promise<void> {
    await (await this.skipLink()).click();
  }
}
