import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatPaginatorModule, type PageEvent } from '@angular/material/paginator';
import { MatSelectModule } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';
import { debounceTime, distinctUntilChanged } from 'rxjs';

import type { Problem } from '../../../../shared/contracts/problem';
import {
  type ReceiverQuery,
  receiverQuery,
  type StoredReceiver,
} from '../../../../shared/contracts/receiver';
import { toProblem } from '../../core/api-problem';
import { Confirm } from '../../ui/confirm/confirm';
import { Icon } from '../../ui/icon/icon';
import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { ReceiverListStore } from './receiver-list-store';
import { ReceiverRow } from './receiver-row';

const PAUSE_MS = 250;

/** Page that lists the workshop's receivers. Search, order and page are in the address. */
@Component({
  selector: 'app-receiver-list',
  imports: [
    Empty,
    Icon,
    Loading,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatPaginatorModule,
    MatSelectModule,
    ProblemNote,
    ReactiveFormsModule,
    ReceiverRow,
    RouterLink,
  ],
  templateUrl: './receiver-list.html',
  styleUrl: './receiver-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[attr.aria-busy]': 'store.isLoading()' },
})
export class ReceiverList {
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);
  protected readonly store = inject(ReceiverListStore);

  readonly search = input<string>();
  readonly sort = input<string>();
  readonly page = input<string>();

  protected readonly searchField = new FormControl('', { nonNullable: true });
  protected readonly done = signal('');
  protected readonly failed = signal<Problem | null>(null);

  /** What the address asks for; an address that makes no sense asks for the first page. */
  protected readonly query = computed<ReceiverQuery>(() => {
    const asked = { search: this.search(), sort: this.sort(), page: this.page() };
    const read = receiverQuery.safeParse(asked);
    return read.success ? read.data : receiverQuery.parse({});
  });

  constructor() {
    effect(() => {
      this.store.show(this.query());
      this.searchField.setValue(this.query().search, { emitEvent: false });
    });
    this.searchField.valueChanges
      .pipe(debounceTime(PAUSE_MS), distinctUntilChanged(), takeUntilDestroyed())
      .subscribe((search) => this.go({ search: search.trim() || null, page: null }));
  }

  protected go(query: Record<string, string | number | null>): void {
    void this.router.navigate([], {
      queryParams: query,
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  }

  protected turn({ pageIndex }: PageEvent): void {
    this.go({ page: pageIndex === 0 ? null : pageIndex + 1 });
  }

  protected async duplicate(receiver: StoredReceiver): Promise<void> {
    const name = $localize`Copy of ${receiver.name}:name:`.slice(0, 120);
    await this.report($localize`“${name}:name:” is kept.`, () =>
      this.store.duplicate(receiver, name),
    );
  }

  protected async remove(receiver: StoredReceiver): Promise<void> {
    const { name } = receiver;
    const agreed = await this.confirm.ask({
      title: $localize`Delete “${name}:name:”?`,
      text: $localize`Its alignment plans go with it. This cannot be undone.`,
      agree: $localize`Delete it`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    await this.report($localize`“${name}:name:” is deleted.`, () => this.store.remove(receiver));
  }

  private async report(success: string, call: () => Promise<void>): Promise<void> {
    this.done.set('');
    this.failed.set(null);
    try {
      await call();
      this.done.set(success);
    } catch (error) {
      this.failed.set(toProblem(error));
    }
  }
}
