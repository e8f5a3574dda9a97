import { ComponentHarness } from '@angular/cdk/testing';

/** Reads and follows the summary of a form's problems in specs. */
export class FormProblemsHarness extends ComponentHarness {
  static readonly hostSelector = 'app-form-problems';

  private readonly box = this.locatorForOptional('[role=alert]');
  private readonly heading = this.locatorForOptional('h2');
  private readonly items = this.locatorForAll('li');
  private readonly links = this.locatorForAll('a');

  async title(): Promise<string | undefined> {
    return (await this.heading())?.text();
  }

  async messages(): Promise<string[]> {
    return Promise.all((await this.items()).map((item) => item.text()));
  }

  async isFocused(): Promise<boolean> {
    return (await (await this.box())?.isFocused()) ?? false;
  }

  /** Clicks the link with that message. */
  async follow(message: string): Promise<void> {
    for (const link of await this.links()) {
      if ((await link.text()) === message) await link.click();
    }
  }
}
