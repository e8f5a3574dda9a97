import { Pipe, type PipeTransform } from '@angular/core';
import type { ValidationErrors } from '@angular/forms';

import { messageOf } from './form-issues';

/** The message a control's errors carry: `<mat-error>{{ control.errors | problemText }}`. */
@Pipe({ name: 'problemText' })
export class ProblemTextPipe implements PipeTransform {
  transform(errors: ValidationErrors | null): string {
    return messageOf(errors) ?? '';
  }
}
