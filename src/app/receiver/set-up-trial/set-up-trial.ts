import { HttpClient, HttpErrorResponse } from '@angular/common/http';
import { computed, inject, Injectable, linkedSignal, signal, untracked } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { bareReceiver, type ReceiverDraft } from '../../../../shared/contracts/receiver';
import { type StoredReceiver, storedReceiver } from '../../../../shared/contracts/receiver';
import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';
import { differences } from '../../ui/receiver-differences/differences';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { changesBetween } from './changes';
import { ChangesAddress } from './changes-address';
import { beginning, follow, type History } from './trial-history';

/** The set-up on trial: changed, undone, taken over into the saved one, or dropped. */
@Injectable()
export class SetUpTrial {
  private readonly http = inject(HttpClient);
  private readonly store = inject(ReceiverStore);
  private readonly text = inject(ChangesAddress);

  readonly saved = computed(() => {
    const receiver = this.store.receiver.value();
    return receiver && bareReceiver.parse(receiver);
  });
  readonly onTrial = this.store.trialReceiver;
  readonly differences = computed(() => differences(this.onTrial() ?? {}, this.saved() ?? {}));
  readonly isChanged = computed(() => this.differences().length > 0);
  readonly isLost = this.store.isTrialLost;
  readonly editable = computed(() => this.store.receiver.value()?.editable ?? false);

  readonly isBusy = signal(false);
  readonly refusal = signal<Problem | null>(null);
  /** What somebody else saved while this was on trial. */
  readonly conflict = signal<StoredReceiver | null>(null);

  /** Each state as set-up and IF of the address say it, so that the browser's back is an undo. */
  private readonly state = computed(() => {
    const { setUp = '', ifHz = 0 } = this.store.address();
    return `${ifHz}|${setUp}`;
  });
  private readonly history = linkedSignal<string, History<string>>({
    source: this.state,
    computation: (state, previous) => (previous ? follow(previous.value, state) : beginning(state)),
  });
  readonly canUndo = computed(() => this.history().at > 0);
  readonly canRedo = computed(() => this.history().at < this.history().states.length - 1);

  /** Puts a set-up on trial. */
  async change(receiver: ReceiverDraft): Promise<void> {
    untracked(this.history);
    const changes = changesBetween(this.saved() ?? {}, receiver);
    await this.store.go({ setUp: this.text.write(changes) });
  }

  undo(): Promise<void> {
    return this.step(-1);
  }

  redo(): Promise<void> {
    return this.step(1);
  }

  async drop(): Promise<void> {
    this.refusal.set(null);
    this.conflict.set(null);
    await this.store.go({ setUp: undefined });
  }

  /** Saves the set-up on trial over the version it was tried from; a newer one is shown instead. */
  async takeOver(version = this.store.receiver.value()?.version): Promise<void> {
    const onTrial = this.onTrial();
    if (!onTrial || version === undefined) return;
    this.isBusy.set(true);
    this.refusal.set(null);
    try {
      const address = `/api/receivers/${encodeURIComponent(this.store.id())}`;
      const call = this.http.put(address, { ...onTrial, version });
      storedReceiver.parse(await firstValueFrom(call));
      this.conflict.set(null);
      this.store.receiver.reload();
      await this.store.go({ setUp: undefined });
    } catch (error) {
      const current = currentOf(error);
      if (current) this.conflict.set(current);
      else this.refusal.set(toProblem(error));
    }
    this.isBusy.set(false);
  }

  /** Goes on from what the other has saved, with the same fields on trial. */
  goOnFromTheirs(): void {
    this.conflict.set(null);
    this.store.receiver.reload();
  }

  private async step(by: -1 | 1): Promise<void> {
    const { states, at } = this.history();
    const state = states[at + by];
    if (state === undefined) return;
    const cut = state.indexOf('|');
    const ifHz = Number(state.slice(0, cut)) || undefined;
    await this.store.go({ ifHz, setUp: state.slice(cut + 1) || undefined });
  }
}

/** The stored state that a refusal for a stale version carries. */
function currentOf(error: unknown): StoredReceiver | undefined {
  if (!(error instanceof HttpErrorResponse) || error.status !== 409) return undefined;
  const { current } = error.error as { current?: unknown };
  return storedReceiver.safeParse(current).data;
}
