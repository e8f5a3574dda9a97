import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { checkWithForm } from '../form-problems/check-with-form';
import { ProblemTextPipe } from '../form-problems/problem-text-pipe';
import { quantities, type QuantityName } from './quantity';
import { QuantityField } from './quantity-field';

/** A labelled field for a quantity, with its unit, a hint and what is wrong with it. */
@Component({
  selector: 'app-quantity-input',
  imports: [
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    QuantityField,
    ReactiveFormsModule,
  ],
  template: `
    <mat-form-field>
      <mat-label>{{ label() }}</mat-label>
      <input matInput [appQuantity]="quantity()" [formControl]="control()" [id]="path()" />
      @if (unit(); as unit) {
        <span matTextSuffix>{{ unit }}</span>
      }
      @if (hint(); as hint) {
        <mat-hint>{{ hint }}</mat-hint>
      }
      <mat-error>{{ control().errors | problemText }}</mat-error>
    </mat-form-field>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    mat-form-field {
      width: 100%;
    }
    span {
      white-space: pre;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuantityInput {
  readonly control = input.required<FormControl<number | null>>();
  readonly quantity = input.required<QuantityName>();
  readonly label = input.required<string>();
  /** Path of the control in its form; the element's id, so that a summary can lead to it. */
  readonly path = input.required<string>();
  readonly hint = input<string>();

  protected readonly unit = computed(() => quantities[this.quantity()].unit);

  constructor() {
    checkWithForm(this.control);
  }
}
