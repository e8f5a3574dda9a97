import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl } from '@angular/forms';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';

import { needed, revalidate } from '../form-problems/form-issues';
import { QuantityInput } from './quantity-input';

@Component({
  imports: [QuantityInput],
  template: `<app-quantity-input
    quantity="frequency"
    path="ifHz"
    label="IF"
    i18n-label
    [control]="control"
  />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly control = new FormControl<number | null>(455_000, needed('Give the IF.'));
}

async function arrange() {
  const fixture = TestBed.createComponent(Page);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  const field = await loader.getHarness(MatFormFieldHarness.with({ floatingLabelText: 'IF' }));
  const input = await field.getControl(MatInputHarness);
  if (!input) throw new Error('The field has no input.');
  return { control: fixture.componentInstance.control, field, input };
}

describe('a quantity’s field', () => {
  it('shows the value in its unit', async () => {
    const { input, field } = await arrange();

    expect(await input.getValue()).toBe('455');
    expect(await field.getSuffixText()).toBe('kHz');
  });

  it('holds the value in the stored unit, and shows how the text was understood', async () => {
    const { control, input } = await arrange();

    await input.setValue('0,56 MHz');
    await input.blur();

    expect(control.value).toBe(560_000);
    expect(await input.getValue()).toBe('560');
  });

  it('keeps what it cannot read, and says what would be right', async () => {
    const { control, field, input } = await arrange();

    await input.setValue('about 455');
    await input.blur();

    expect(control.value).toBeNull();
    expect(await input.getValue()).toBe('about 455');
    expect((await field.getTextErrors())[0]).toContain('Give a number');
  });

  it('goes on saying so when the form is judged anew', async () => {
    const { control, input } = await arrange();
    await input.setValue('455 volts');

    revalidate(control);

    expect(String(control.errors?.['problem'])).toContain('volts');
  });

  it('says what is missing when it is empty', async () => {
    const { field, input } = await arrange();

    await input.setValue('');
    await input.blur();

    expect(await field.getTextErrors()).toEqual(['Give the IF.']);
  });
});
