import {
  ChangeDetectionStrategy,
  Component,
  effect,
  inject,
  input,
  numberAttribute,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { StoredReceiver } from '../../../../shared/contracts/receiver';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { ReceiverForm } from './receiver-form/receiver-form';
import { SetUpStore } from './set-up-store';

/** Page that sets up a receiver: a new one, or one that is kept already. */
@Component({
  selector: 'app-set-up',
  imports: [Loading, MatButtonModule, ProblemNote, ReceiverForm, RouterLink],
  templateUrl: './set-up.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(window:beforeunload)': 'warnBeforeUnload($event)' },
})
export class SetUp implements Unsaved {
  private readonly router = inject(Router);
  protected readonly store = inject(SetUpStore);

  /** Of the address; none for a new receiver. */
  readonly id = input(undefined, {
    transform: (id: string | undefined) => (id === undefined ? undefined : numberAttribute(id)),
  });

  /** Type of set and IF to begin a new receiver from. */
  readonly type = input<string>();
  readonly ifHz = input(undefined, {
    transform: (hz: string | undefined) => (hz === undefined ? undefined : numberAttribute(hz)),
  });

  private readonly form = viewChild(ReceiverForm);

  constructor() {
    effect(() => {
      this.store.open(this.id());
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form()?.hasUnsavedChanges() ?? false;
  }

  protected warnBeforeUnload(event: BeforeUnloadEvent): void {
    if (this.hasUnsavedChanges()) event.preventDefault();
  }

  protected async showKept({ id }: StoredReceiver): Promise<void> {
    await this.router.navigate(['/receivers', id]);
  }
}
