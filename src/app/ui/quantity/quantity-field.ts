import { Directive, ElementRef, forwardRef, inject, input, signal } from '@angular/core';
import {
  type ControlValueAccessor,
  NG_VALIDATORS,
  NG_VALUE_ACCESSOR,
  type ValidationErrors,
  type Validator,
} from '@angular/forms';

import { formatQuantity, parseQuantity, type QuantityName } from './quantity';

/**
 * Makes a text input hold a quantity: the control's value is a number in the stored unit or null.
 * What cannot be read stays as typed, with the reason in the control's error `problem`.
 */
@Directive({
  selector: 'input[appQuantity]',
  providers: [
    { provide: NG_VALUE_ACCESSOR, useExisting: forwardRef(() => QuantityField), multi: true },
    { provide: NG_VALIDATORS, useExisting: forwardRef(() => QuantityField), multi: true },
  ],
  host: {
    type: 'text',
    inputmode: 'decimal',
    autocomplete: 'off',
    spellcheck: 'false',
    '[disabled]': 'disabled()',
    '(input)': 'read()',
    '(blur)': 'leave()',
  },
})
export class QuantityField implements ControlValueAccessor, Validator {
  private readonly input = inject<ElementRef<HTMLInputElement>>(ElementRef).nativeElement;

  readonly appQuantity = input.required<QuantityName>();

  protected readonly disabled = signal(false);

  private problem: string | null = null;
  private changed: (value: number | null) => void = () => undefined;
  private touched: () => void = () => undefined;

  writeValue(value: number | null): void {
    this.problem = null;
    this.input.value = formatQuantity(value, this.appQuantity());
  }

  registerOnChange(changed: (value: number | null) => void): void {
    this.changed = changed;
  }

  registerOnTouched(touched: () => void): void {
    this.touched = touched;
  }

  setDisabledState(disabled: boolean): void {
    this.disabled.set(disabled);
  }

  validate(): ValidationErrors | null {
    return this.problem === null ? null : { problem: this.problem };
  }

  protected read(): void {
    const reading = parseQuantity(this.input.value, this.appQuantity());
    this.problem = 'problem' in reading ? reading.problem : null;
    this.changed('problem' in reading ? null : reading.value);
  }

  /** Shows how the text was understood: "0,455 MHz" becomes "455". */
  protected leave(): void {
    const reading = parseQuantity(this.input.value, this.appQuantity());
    if ('value' in reading) this.input.value = formatQuantity(reading.value, this.appQuantity());
    this.touched();
  }
}
