import { computed, inject, Injectable } from '@angular/core';

import { bareReceiver } from '../../../../shared/contracts/receiver';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { changesBetween } from '../set-up-trial/changes';
import { ChangesAddress } from '../set-up-trial/changes-address';
import { latestAnswer } from '../trial/latest-answer';
import { sourceFields } from '../trial/station-source';
import { TrialApi } from '../trial/trial-api';
import { TrialStore } from '../trial/trial-store';
import { curedSet } from './cured-receiver';
import { bestFirst } from './cure-words';

/** All cures of the set as saved, and which of them is on trial. */
@Injectable()
export class CureTrial {
  private readonly api = inject(TrialApi);
  private readonly trial = inject(TrialStore);
  private readonly store = inject(ReceiverStore);
  private readonly text = inject(ChangesAddress);

  private readonly saved = computed(() => {
    const receiver = this.store.receiver.value();
    return receiver && bareReceiver.parse(receiver);
  });

  /** Of the saved set: a cure on trial does not change the table it was taken from. */
  readonly answer = latestAnswer(
    computed(
      () => {
        const [setup, receiver] = [this.trial.setup(), this.saved()];
        return setup && receiver
          ? { receiver, site: setup.site, ...sourceFields(setup.source) }
          : null;
      },
      { equal: (one, other) => JSON.stringify(one) === JSON.stringify(other) },
    ),
    (body) => this.api.cures(body),
  );

  private readonly all = computed(() => this.answer.value()?.cures ?? []);
  /** What helps most first, each with the address that puts it on trial. */
  readonly cures = computed(() => {
    const saved = this.saved();
    if (!saved) return [];
    const [ifNow, setUpNow] = [this.trial.trialHz(), this.store.address().setUp];
    return bestFirst(this.all()).map((cure) => {
      const { receiver, ifHz } = curedSet(saved, cure, this.all());
      const setUp = this.text.write(changesBetween(saved, receiver));
      return { cure, ifHz, setUp, isOnTrial: ifHz === ifNow && setUp === setUpNow };
    });
  });

  /** Puts a cure on trial in place of what is on trial; one step back undoes it. */
  async take({ ifHz, setUp }: { ifHz: number; setUp: string | undefined }): Promise<void> {
    await this.store.go({ ifHz: ifHz === this.saved()?.ifHz ? undefined : ifHz, setUp });
  }

  /** The set as saved. */
  async drop(): Promise<void> {
    await this.store.go({ ifHz: undefined, setUp: undefined });
  }
}
