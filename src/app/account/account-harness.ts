import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';

import { FormProblemsHarness } from '../ui/form-problems/form-problems-harness';

/** Fills in and sends the forms of signing in and registering in specs. */
export class AccountHarness extends ComponentHarness {
  static readonly hostSelector = 'app-sign-in, app-register';

  private readonly problems = this.locatorFor(FormProblemsHarness);

  async fill(label: string, text: string): Promise<void> {
    await (await this.input(label)).setValue(text);
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }

  async messages(): Promise<string[]> {
    return (await this.problems()).messages();
  }

  async typeOf(label: string): Promise<string> {
    return (await this.input(label)).getType();
  }

  private async input(label: string): Promise<MatInputHarness> {
    const field = this.locatorFor(MatFormFieldHarness.with({ floatingLabelText: label }));
    const control = await (await field()).getControl(MatInputHarness);
    if (!control) throw new Error(`The field "${label}" has no input.`);
    return control;
  }
}
