import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DOCUMENT,
  effect,
  type ElementRef,
  inject,
  Injector,
  input,
  output,
  viewChild,
} from '@angular/core';

import type { FormIssue } from './form-issues';

const FOCUSABLE = 'input, select, textarea, button, [tabindex]';

/**
 * Summary of what is wrong with a form, on its top. Takes the focus whenever it is given issues.
 * Each links to the field whose element id is the issue's path, or that of what it is a part of.
 */
@Component({
  selector: 'app-form-problems',
  templateUrl: './form-problems.html',
  styleUrl: './form-problems.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FormProblems {
  private readonly document = inject(DOCUMENT);
  private readonly injector = inject(Injector);

  readonly issues = input.required<readonly FormIssue[]>();
  /** A link is followed: the moment to open what hides its field. */
  readonly follow = output<string>();

  protected readonly count = computed(() => this.issues().length);

  private readonly box = viewChild<ElementRef<HTMLElement>>('box');

  constructor() {
    effect(() => {
      if (this.issues().length > 0) this.afterRender(() => this.box()?.nativeElement.focus());
    });
  }

  protected go(event: Event, path: string): void {
    event.preventDefault();
    this.follow.emit(path);
    this.afterRender(() => this.fieldOf(path)?.focus());
  }

  private afterRender(then: () => void): void {
    afterNextRender({ read: then }, { injector: this.injector });
  }

  private fieldOf(path: string): HTMLElement | null {
    const steps = path.split('.');
    for (let length = steps.length; length > 0; length--) {
      const element = this.document.getElementById(steps.slice(0, length).join('.'));
      if (element !== null) {
        return element.matches(FOCUSABLE) ? element : element.querySelector<HTMLElement>(FOCUSABLE);
      }
    }
    return null;
  }
}
