import { type AbstractControl, FormControl, type ValidatorFn } from '@angular/forms';

import { needed } from '../../../ui/form-problems/form-issues';

/** A control that goes back to the value it begins with. */
export const held = <T>(value: T, ...validators: ValidatorFn[]) =>
  new FormControl(value, { nonNullable: true, validators });

/** A number; with a message it may not be left out. */
export const number = (value: number | null, message?: string) =>
  held(value, ...(message === undefined ? [] : [needed(message)]));

/** Needed only while something holds for the group that the control is in. */
export function neededWhile(
  holds: (group: AbstractControl | null) => boolean,
  message: string,
): ValidatorFn {
  const check = needed(message);
  return (control) => (holds(control.parent) ? check(control) : null);
}

const isFitted = (group: AbstractControl | null): boolean => group?.get('fitted')?.value === true;

/** Needed only while the group's box "fitted" is ticked. */
export const fittedNumber = (message: string, value: number | null = null) =>
  held<number | null>(value, neededWhile(isFitted, message));
