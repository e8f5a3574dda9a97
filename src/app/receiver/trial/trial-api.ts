import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';

import {
  type Assessment,
  assessment,
  type AssessmentInput,
} from '../../../../shared/contracts/assessment';
import {
  type BreakthroughHoursAnswer,
  breakthroughHoursAnswer,
  type BreakthroughHoursInput,
} from '../../../../shared/contracts/breakthrough-hours';
import {
  type CandidatesAnswer,
  candidatesAnswer,
  type CandidatesInput,
} from '../../../../shared/contracts/candidates';
import { type CuresAnswer, curesAnswer, type CuresInput } from '../../../../shared/contracts/cures';
import {
  type FieldStrengthsAnswer,
  fieldStrengthsAnswer,
  type FieldStrengthsInput,
} from '../../../../shared/contracts/field-strengths';
import {
  whistlesAnswer,
  type WhistlesAnswer,
  type WhistlesInput,
} from '../../../../shared/contracts/whistles';
import { ofOurServer, sampleOfAssessment, sampleOfFields } from './sampled-answer';

/** The computing calls a trial makes. */
@Injectable({ providedIn: 'root' })
export class TrialApi {
  private readonly http = inject(HttpClient);

  fieldStrengths(body: FieldStrengthsInput): Observable<FieldStrengthsAnswer> {
    return this.http
      .post<FieldStrengthsAnswer>('/api/field-strengths', body)
      .pipe(map((answer) => ofOurServer(fieldStrengthsAnswer, answer, sampleOfFields)));
  }

  assess(body: AssessmentInput): Observable<Assessment> {
    return this.http
      .post<Assessment>('/api/assessments', body)
      .pipe(map((answer) => ofOurServer(assessment, answer, sampleOfAssessment)));
  }

  candidates(body: CandidatesInput): Observable<CandidatesAnswer> {
    return this.http
      .post('/api/if-candidates', body)
      .pipe(map((answer) => candidatesAnswer.parse(answer)));
  }

  cures(body: CuresInput): Observable<CuresAnswer> {
    return this.http.post('/api/cures', body).pipe(map((answer) => curesAnswer.parse(answer)));
  }

  hours(body: BreakthroughHoursInput): Observable<BreakthroughHoursAnswer> {
    return this.http
      .post('/api/breakthrough-hours', body)
      .pipe(map((answer) => breakthroughHoursAnswer.parse(answer)));
  }

  whistles(body: WhistlesInput): Observable<WhistlesAnswer> {
    return this.http
      .post('/api/whistles', body)
      .pipe(map((answer) => whistlesAnswer.parse(answer)));
  }
}
