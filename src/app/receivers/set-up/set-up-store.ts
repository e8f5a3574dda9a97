import { HttpClient, HttpErrorResponse, httpResource } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import {
  type ReceiverDraft,
  type StoredReceiver,
  storedReceiver,
} from '../../../../shared/contracts/receiver';
import { toProblem } from '../../core/api-problem';

/** What saving came to: kept, or refused because somebody else saved first. */
export type Saved = { readonly kept: StoredReceiver } | { readonly current: StoredReceiver };

/** The one receiver that is being set up; a new one has no id yet. */
@Injectable()
export class SetUpStore {
  private readonly http = inject(HttpClient);
  private readonly id = signal<number | undefined>(undefined);
  private readonly resource = httpResource(
    () => (this.id() === undefined ? undefined : `/api/receivers/${this.id()}`),
    { parse: (body) => storedReceiver.parse(body) },
  );

  readonly receiver = computed(() =>
    this.resource.hasValue() ? this.resource.value() : undefined,
  );
  readonly problem = computed(() => {
    const error = this.resource.error();
    return error === undefined ? undefined : toProblem(error);
  });

  open(id: number | undefined): void {
    this.id.set(id);
  }

  reload(): void {
    this.resource.reload();
  }

  async add(draft: ReceiverDraft): Promise<Saved> {
    return { kept: await this.answer(this.http.post('/api/receivers', draft)) };
  }

  /** Changes the version the draft was made from. Rejects with the server's problem. */
  async change(id: number, version: number, draft: ReceiverDraft): Promise<Saved> {
    try {
      const call = this.http.put(`/api/receivers/${id}`, { ...draft, version });
      return { kept: await this.answer(call) };
    } catch (error) {
      const current = currentOf(error);
      if (current === undefined) throw error;
      return { current };
    }
  }

  private async answer(call: ReturnType<HttpClient['post']>): Promise<StoredReceiver> {
    return storedReceiver.parse(await firstValueFrom(call));
  }
}

/** The stored state that a refusal for a stale version carries. */
function currentOf(error: unknown): StoredReceiver | undefined {
  if (!(error instanceof HttpErrorResponse) || error.status !== 409) return undefined;
  const { current } = error.error as { current?: unknown };
  return storedReceiver.safeParse(current).data;
}
