import { HttpClient, httpResource } from '@angular/common/http';
import { computed, inject, Injectable, linkedSignal, signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { type Page, pageOf } from '../../../../shared/contracts/paging';
import {
  bareReceiver,
  type ReceiverQuery,
  storedReceiver,
  type StoredReceiver,
} from '../../../../shared/contracts/receiver';
import { toProblem } from '../../core/api-problem';

const receiverPage = pageOf(storedReceiver);

/** The workshop's receivers as the server knows them, a page at a time. */
@Injectable()
export class ReceiverListStore {
  private readonly http = inject(HttpClient);
  private readonly asked = signal<ReceiverQuery | undefined>(undefined);
  private readonly resource = httpResource(
    () => {
      const query = this.asked();
      return query && { url: '/api/receivers', params: { ...query } };
    },
    { parse: (body) => receiverPage.parse(body) },
  );

  /** The last page that came: it stays in sight while the next is on its way. */
  readonly page = linkedSignal<Page<StoredReceiver> | undefined, Page<StoredReceiver> | undefined>({
    source: () => (this.resource.hasValue() ? this.resource.value() : undefined),
    computation: (page, previous) => page ?? previous?.value,
  }).asReadonly();
  readonly isLoading = this.resource.isLoading;
  readonly problem = computed(() => {
    const error = this.resource.error();
    return error === undefined ? undefined : toProblem(error);
  });

  show(query: ReceiverQuery): void {
    this.asked.set(query);
  }

  reload(): void {
    this.resource.reload();
  }

  /** Keeps a copy under another name. Rejects with the server's problem. */
  async duplicate(receiver: StoredReceiver, name: string): Promise<void> {
    const copy = { ...bareReceiver.parse(receiver), name };
    await firstValueFrom(this.http.post('/api/receivers', copy));
    this.reload();
  }

  /** Deletes a receiver and its plans. Rejects with the server's problem. */
  async remove({ id }: StoredReceiver): Promise<void> {
    await firstValueFrom(this.http.delete(`/api/receivers/${id}`));
    this.reload();
  }
}
