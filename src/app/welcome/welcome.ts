import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { noiseField } from '../../../shared/radio/propagation/noise';
import { BandStrip } from '../charts/band-strip/band-strip';
import { loudness } from '../charts/band-strip/strip-layout';
import { CandidateLane } from '../charts/candidate-lane/candidate-lane';
import { awaitedWords } from '../charts/chart/awaited-words';
import { ChartOrigin } from '../charts/chart/chart-origin';
import { FrequencyPipe } from '../ui/frequency-pipe';
import { Loading } from '../ui/page-state/loading';
import { ProblemNote } from '../ui/page-state/problem-note';
import { lane, tellingStrip } from './answer';
import { adviceWords, betterIf, verdictWords } from './answer-words';
import { NextStep } from './next-step/next-step';
import { ASSUMED_FIELD_DB, siteOf } from './trial';
import { TrialFields } from './trial-fields';
import { TrialStore } from './trial-store';
import { WelcomeOrigin } from './welcome-origin';

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
    NextStep,
    ProblemNote,
    TrialFields,
  ],
  providers: [{ provide: ChartOrigin, useClass: WelcomeOrigin }],
  templateUrl: './welcome.html',
  styleUrl: './welcome.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Welcome {
  protected readonly store = inject(TrialStore);

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
  /** The strip still holds for what was asked before. */
  protected readonly awaited = computed(() => {
    const hz = this.store.trialHz();
    return this.store.isAssessing() && hz !== undefined ? awaitedWords(hz, hz) : null;
  });
  protected readonly noise = computed(() => {
    const trial = this.store.trial();
    return (hz: number) => (trial ? noiseField(siteOf(trial), hz, NOISE_BANDWIDTH_HZ) : null);
  });
}
