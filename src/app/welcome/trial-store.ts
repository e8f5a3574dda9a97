import { httpResource } from '@angular/common/http';
import { computed, Injectable, linkedSignal, signal } from '@angular/core';

import { assessment } from '../../../shared/contracts/assessment';
import { candidatesAnswer } from '../../../shared/contracts/candidates';
import { fieldStrengthsAnswer } from '../../../shared/contracts/field-strengths';
import { toProblem } from '../core/api-problem';
import { assessmentQuestion, candidatesQuestion, fieldsQuestion, type Trial } from './trial';

/** What the server computes for a visitor's set; nothing of it is stored. */
@Injectable()
export class TrialStore {
  private readonly asked = signal<Trial | undefined>(undefined);
  private readonly moved = linkedSignal(() => this.asked()?.ifHz);

  private readonly candidatesResource = httpResource(
    () => {
      const trial = this.asked();
      return trial && post('/api/if-candidates', candidatesQuestion(trial));
    },
    { parse: (body) => candidatesAnswer.parse(body) },
  );
  private readonly assessmentResource = httpResource(
    () => {
      const [trial, trialHz] = [this.asked(), this.moved()];
      if (trial === undefined || trialHz === undefined) return undefined;
      return post('/api/assessments', assessmentQuestion(trial, trialHz));
    },
    { parse: (body) => assessment.parse(body) },
  );
  private readonly fieldsResource = httpResource(
    () => {
      const trial = this.asked();
      return trial && post('/api/field-strengths', fieldsQuestion(trial));
    },
    { parse: (body) => fieldStrengthsAnswer.parse(body) },
  );
  private readonly resources = [
    this.candidatesResource,
    this.assessmentResource,
    this.fieldsResource,
  ];

  readonly trial = this.asked.asReadonly();
  /** Where the IF is tried, hertz. */
  readonly trialHz = this.moved.asReadonly();
  readonly candidates = lastValue(this.candidatesResource);
  readonly assessment = lastValue(this.assessmentResource);
  readonly isAssessing = computed(() => this.assessmentResource.isLoading());
  readonly stations = computed(() => {
    const fields = this.fieldsResource.hasValue() ? this.fieldsResource.value().fields : [];
    return fields.map(({ station, ...rest }) => ({ id: station, ...rest }));
  });
  readonly isLoading = computed(() => this.resources.some((each) => each.isLoading()));
  readonly problem = computed(() => {
    const error = this.resources.map((each) => each.error()).find((each) => each !== undefined);
    return error === undefined ? undefined : toProblem(error);
  });

  ask(trial: Trial): void {
    this.asked.set(trial);
  }

  /** Tries another IF on the same set. */
  move(ifHz: number): void {
    this.moved.set(ifHz);
  }

  retry(): void {
    this.resources.forEach((each) => each.reload());
  }
}

const post = (url: string, body: unknown) => ({ url, method: 'POST', body });

/** The value of a resource; the one before stays in sight while the next is computed. */
function lastValue<T>(resource: { hasValue(): boolean; value(): T | undefined }) {
  return linkedSignal<T | undefined, T | undefined>({
    source: () => (resource.hasValue() ? resource.value() : undefined),
    computation: (value, previous) => value ?? previous?.value,
  }).asReadonly();
}
