import { ComponentHarness } from '@angular/cdk/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness, MatNativeSelectHarness } from '@angular/material/input/testing';
import { MatRadioButtonHarness } from '@angular/material/radio/testing';
import { MatStepperHarness } from '@angular/material/stepper/testing';

/** The guided import as a person works with it. */
export class ImportPageHarness extends ComponentHarness {
  static readonly hostSelector = 'app-import-page';

  /** Name of the step that is open. */
  async step(): Promise<string> {
    const stepper = await this.locatorFor(MatStepperHarness)();
    const [open] = await stepper.getSteps({ selected: true });
    return (await open?.getLabel()) ?? '';
  }

  async goTo(step: string): Promise<void> {
    const stepper = await this.locatorFor(MatStepperHarness)();
    await stepper.selectStep({ label: step });
  }

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async choose(select: string, option: string): Promise<void> {
    const named = MatNativeSelectHarness.with({ selector: `[aria-label="${select}"]` });
    await (await this.locatorFor(named)()).selectOptions({ text: option });
  }

  async chooseLabelled(label: string, option: string): Promise<void> {
    const fields = await this.locatorForAll(
      MatFormFieldHarness.with({ floatingLabelText: label }),
    )();
    const select = await fields[0]?.getControl(MatNativeSelectHarness);
    const [chosen] = (await select?.getOptions({ text: option })) ?? [];
    if (!select || !chosen) throw new Error(`No option "${option}" under "${label}".`);
    // As a browser does, one change a choice; the harness's own way sends another on the way there.
    const host = await select.host();
    await host.setInputValue(await (await chosen.host()).getProperty<string>('value'));
    await host.dispatchEvent('change');
  }

  async pick(radio: string): Promise<void> {
    await (await this.locatorFor(MatRadioButtonHarness.with({ label: radio }))()).check();
  }

  async type(label: string, text: string): Promise<void> {
    await (await this.locatorFor(MatInputHarness.with({ label }))()).setValue(text);
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }
}
