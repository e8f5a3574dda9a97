import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import { noiseField } from '../../../shared/radio/noise';
import { BandStrip } from '../charts/band-strip/band-strip';
import { loudness } from '../charts/band-strip/strip-layout';
import { CandidateLane } from '../charts/candidate-lane/candidate-lane';
import { OWN_MACHINE } from '../core/own-machine';
import { Session } from '../core/session/session';
import { FrequencyPipe } from '../ui/frequency-pipe';
import { Loading } from '../ui/page-state/loading';
import { ProblemNote } from '../ui/page-state/problem-note';
import { lane, tellingStrip } from './answer';
import { adviceWords, betterIf, verdictWords } from './answer-words';
import { ASSUMED_FIELD_DB, siteOf } from './trial';
import { TrialFields } from './trial-fields';
import { TrialStore } from './trial-store';

/** Bandwidth in which a visitor's noise is counted: a broadcast channel, hertz. */
const NOISE_BANDWIDTH_HZ = 8000;

/** The first page: what this is, and an answer within a minute, without an account. */
@Component({
  selector: 'app-welcome',
  imports: [
    BandStrip,
    CandidateLane,
    FrequencyPipe,
    Loading,
    MatButtonModule,
    ProblemNote,
    RouterLink,
    TrialFields,
  ],
  templateUrl: './welcome.html',
  styleUrl: './welcome.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Welcome {
  private readonly router = inject(Router);
  protected readonly store = inject(TrialStore);
  protected readonly session = inject(Session);

  protected readonly isOwnMachine = inject(OWN_MACHINE);
  protected readonly assumedDb = ASSUMED_FIELD_DB;
  /** Everything on the page, once all of it is there. */
  protected readonly answer = computed(() => {
    const [trial, trialHz] = [this.store.trial(), this.store.trialHz()];
    const [candidates, assessment] = [this.store.candidates(), this.store.assessment()];
    if (!trial || trialHz === undefined || !candidates || !assessment) return undefined;
    return {
      trialHz,
      presentHz: candidates.present.ifHz,
      betterHz: betterIf(candidates),
      advice: adviceWords(candidates, trial),
      verdict: verdictWords(assessment, trial.period),
      lane: lane(candidates),
      strip: tellingStrip(trial, assessment.bands),
      loudness: loudness(assessment.bands),
    };
  });
  protected readonly noise = computed(() => {
    const trial = this.store.trial();
    return (hz: number) => (trial ? noiseField(siteOf(trial), hz, NOISE_BANDWIDTH_HZ) : null);
  });
  /** Where this set can be set up and kept. */
  protected readonly setUp = computed(() => {
    const trial = this.store.trial();
    const path = '/receivers/new';
    const queryParams = trial ? { type: trial.type.id, ifHz: trial.ifHz } : {};
    return {
      path,
      queryParams,
      url: this.router.createUrlTree([path], { queryParams }).toString(),
    };
  });
}
