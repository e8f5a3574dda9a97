import { ComponentHarness } from '@angular/cdk/testing';

/** Reads the list of receivers in specs. */
export class ReceiverListHarness extends ComponentHarness {
  static readonly hostSelector = 'app-receiver-list';

  private readonly headings = this.locatorForAll('li h2');
  private readonly alerts = this.locatorForOptional('[role=alert]');
  private readonly statusLine = this.locatorFor('[role=status]');

  async names(): Promise<string[]> {
    return Promise.all((await this.headings()).map((heading) => heading.text()));
  }

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async alert(): Promise<string | undefined> {
    return (await this.alerts())?.text();
  }

  async status(): Promise<string> {
    return (await this.statusLine()).text();
  }
}
