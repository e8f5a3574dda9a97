import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatSelectHarness } from '@angular/material/select/testing';

/** A site's page as a person works with it. */
export class SitePageHarness extends ComponentHarness {
  static readonly hostSelector = 'app-site-page';

  private readonly summary = this.locatorForOptional('[role=alert]');

  async type(label: string, text: string): Promise<void> {
    const field = await this.field(label);
    await (await field.getControl(MatInputHarness))?.setValue(text);
  }

  async choose(label: string, text: string | RegExp): Promise<void> {
    const field = await this.field(label);
    await (await field.getControl(MatSelectHarness))?.clickOptions({ text });
  }

  async textIn(label: string): Promise<string> {
    const field = await this.field(label);
    return (await (await field.getControl(MatInputHarness))?.getValue()) ?? '';
  }

  async errorOf(label: string): Promise<string> {
    return (await (await this.field(label)).getTextErrors()).join(' ');
  }

  /** What the summary on top says, empty while there is none. */
  async problems(): Promise<string> {
    return (await (await this.summary())?.text()) ?? '';
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }

  async buttons(): Promise<string[]> {
    const found = await this.locatorForAll(MatButtonHarness)();
    return Promise.all(found.map((button) => button.getText()));
  }

  private field(label: string): Promise<MatFormFieldHarness> {
    return this.locatorFor(MatFormFieldHarness.with({ floatingLabelText: label }))();
  }
}
