import { signal } from '@angular/core';
import type { AbstractControl } from '@angular/forms';
import type * as z from 'zod';

import type { Problem } from '../../../../shared/contracts/problem';
import { formIssues, type FormIssue, revalidate, showIssues } from './form-issues';

/** A form's way to the server: what is wrong lands on its fields, wherever it was found. */
export class Submission<S extends z.ZodType> {
  private readonly form: AbstractControl;
  private readonly schema: S;
  private readonly toProblem: (error: unknown) => Problem;
  private readonly found = signal<readonly FormIssue[]>([]);
  private readonly busy = signal(false);

  /** For the summary on top of the form. */
  readonly issues = this.found.asReadonly();
  readonly isBusy = this.busy.asReadonly();

  constructor(form: AbstractControl, schema: S, toProblem: (error: unknown) => Problem) {
    this.form = form;
    this.schema = schema;
    this.toProblem = toProblem;
  }

  /**
   * Sends what the contract accepts. Answers what the call answered, or undefined when the form
   * or the server objects; the objections are then in `issues` and beside the fields.
   */
  async send<T>(value: unknown, call: (valid: z.output<S>) => Promise<T>): Promise<T | undefined> {
    if (this.busy()) return undefined;
    revalidate(this.form);
    const issues = formIssues(this.form, this.schema, value);
    if (issues.length > 0) {
      this.object(issues);
      return undefined;
    }

    this.busy.set(true);
    try {
      const answer = await call(this.schema.parse(value));
      this.found.set([]);
      return answer;
    } catch (error) {
      this.object(this.issuesOf(this.toProblem(error)));
      return undefined;
    } finally {
      this.busy.set(false);
    }
  }

  private object(issues: readonly FormIssue[]): void {
    showIssues(this.form, issues);
    this.found.set(issues);
  }

  /** A problem that names no field of ours is said as a whole. */
  private issuesOf({ title, issues }: Problem): FormIssue[] {
    const named = (issues ?? []).filter(({ path }) => path !== '');
    return named.length > 0 ? named : [{ path: '', message: title }];
  }
}
