import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';

import { DialStrips } from '../dial-strips/dial-strips';
import { ResponseTable } from '../response-table/response-table';
import { TrialStore } from '../trial/trial-store';

/** Section of a receiver: what is heard where on its dial, and why. */
@Component({
  selector: 'app-dial-page',
  templateUrl: './dial-page.html',
  styleUrl: './dial-page.scss',
  imports: [DialStrips, ResponseTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DialPage {
  protected readonly store = inject(TrialStore);

  protected readonly receiver = computed(() => this.store.setup()?.receiver);

  protected showWorking(id: string): void {
    this.store.picked.set(id);
    this.store.worked.set(id);
  }
}
