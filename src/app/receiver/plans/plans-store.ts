import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { pageOf } from '../../../../shared/contracts/paging';
import { type Plan, plan } from '../../../../shared/contracts/plan';
import { type Remote, remote } from '../../core/remote';

const MOST = 500;

/** Plans kept for a receiver. */
@Injectable()
export class PlansStore {
  private readonly http = inject(HttpClient);

  /** The plans of a receiver. Call in an injection context. */
  all(receiverId: () => string) {
    return remote(() => `${plansOf(receiverId())}?pageSize=${MOST}`, pageOf(plan));
  }

  /** One plan. Call in an injection context. */
  one(receiverId: () => string, planId: () => string): Remote<Plan> {
    return remote(() => `${plansOf(receiverId())}/${encodeURIComponent(planId())}`, plan);
  }

  /** Rejects with the server's problem. */
  async remove({ receiverId, id }: Plan): Promise<void> {
    await firstValueFrom(this.http.delete(`${plansOf(String(receiverId))}/${id}`));
  }
}

const plansOf = (receiverId: string): string =>
  `/api/receivers/${encodeURIComponent(receiverId)}/plans`;
