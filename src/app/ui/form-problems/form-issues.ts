import { type AbstractControl, FormArray, FormGroup, type ValidatorFn } from '@angular/forms';
import type * as z from 'zod';

/** What is wrong with one field: its path in the form, and what would be right. */
export interface FormIssue {
  readonly path: string;
  readonly message: string;
}

/** Key under which every control of ours carries its message. */
const KEY = 'problem';

/** Refuses an empty value with a message of the field's own. */
export function needed(message: string): ValidatorFn {
  return ({ value }) =>
    value === null || (typeof value === 'string' && value.trim() === '')
      ? { [KEY]: message }
      : null;
}

/** Message a control carries, or null. */
export function messageOf(errors: AbstractControl['errors']): string | null {
  const message: unknown = errors?.[KEY];
  return typeof message === 'string' ? message : null;
}

/** Everything the form's own controls object to, in the order of the form. */
export function controlIssues(control: AbstractControl, path = ''): FormIssue[] {
  const message = messageOf(control.errors);
  const own = message === null ? [] : [{ path, message }];
  if (!(control instanceof FormGroup || control instanceof FormArray)) return own;
  return [
    ...own,
    ...Object.entries(control.controls).flatMap(([key, child]) =>
      controlIssues(child, path === '' ? key : `${path}.${key}`),
    ),
  ];
}

/** Lets every control judge itself anew: messages put on it from outside are gone then. */
export function revalidate(control: AbstractControl): void {
  if (control instanceof FormGroup || control instanceof FormArray) {
    Object.values(control.controls).forEach((child) => {
      revalidate(child);
    });
  }
  control.updateValueAndValidity({ onlySelf: true, emitEvent: false });
}

/** What a contract objects to, as paths of the form. */
export function schemaIssues({ issues }: z.ZodError): FormIssue[] {
  return issues.map(({ path, message }) => ({ path: path.join('.'), message }));
}

/**
 * What is wrong with a form that is being sent: what its controls object to first, then what the
 * contract does, one message a field.
 */
export function formIssues(form: AbstractControl, schema: z.ZodType, value: unknown): FormIssue[] {
  const own = controlIssues(form);
  const parsed = schema.safeParse(value);
  const others = parsed.success ? [] : schemaIssues(parsed.error);
  const seen = new Set<string>();
  return [...own, ...others].filter(({ path }) => !seen.has(path) && seen.add(path));
}

/** Puts messages on the fields they belong to; each goes when its field is changed. */
export function showIssues(form: AbstractControl, issues: readonly FormIssue[]): void {
  form.markAllAsTouched();
  for (const { path, message } of issues) {
    form.get(path)?.setErrors({ [KEY]: message });
  }
}
