import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatCheckboxHarness } from '@angular/material/checkbox/testing';

/** A page of plans as its reader meets it: words, rows and buttons. */
export abstract class PlanPageHarness extends ComponentHarness {
  private readonly headings = this.locatorForAll('h1, h2, h3');
  private readonly alerts = this.locatorForAll('[role="alert"]');
  private readonly rows = this.locatorForAll('tr');
  private readonly items = this.locatorForAll('li');

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async headingTexts(): Promise<string[]> {
    return Promise.all((await this.headings()).map((each) => each.text()));
  }

  async alertTexts(): Promise<string[]> {
    return Promise.all((await this.alerts()).map((each) => each.text()));
  }

  /** The row of a table that begins with a text. */
  async row(beginning: string): Promise<string | undefined> {
    const texts = await Promise.all((await this.rows()).map((each) => each.text()));
    return texts.find((text) => text.startsWith(beginning));
  }

  async itemTexts(): Promise<string[]> {
    return Promise.all((await this.items()).map((each) => each.text()));
  }

  async press(text: string | RegExp): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }

  async isOffered(text: string): Promise<boolean> {
    return (await this.locatorForOptional(MatButtonHarness.with({ text }))()) !== null;
  }

  async tick(label: RegExp): Promise<void> {
    for (const box of await this.locatorForAll(MatCheckboxHarness)()) {
      if (label.test((await box.getAriaLabel()) ?? '')) await box.check();
    }
  }

  async linkField(): Promise<string | undefined> {
    return (await this.locatorForOptional('input[readonly]')())?.getProperty<string>('value');
  }
}

export class PlanListHarness extends PlanPageHarness {
  static readonly hostSelector = 'app-plan-list';
}
export class OnePlanHarness extends PlanPageHarness {
  static readonly hostSelector = 'app-plan-page';
}
export class ComparePageHarness extends PlanPageHarness {
  static readonly hostSelector = 'app-compare-page';
}
export class SharedPlanPageHarness extends PlanPageHarness {
  static readonly hostSelector = 'app-shared-plan-page';
}
