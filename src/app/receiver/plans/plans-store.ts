import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { pageOf } from '../../../../shared/contracts/paging';
import {
  type Plan,
  plan,
  type PlanInput,
  type PlanShare,
  planShare,
  type WholePlan,
  wholePlan,
} from '../../../../shared/contracts/plan';
import { type Remote, remote } from '../../core/remote';

const MOST = 500;

/** Plans kept for a receiver. Every verb rejects with the server's problem. */
@Injectable()
export class PlansStore {
  private readonly http = inject(HttpClient);

  /** The plans of a receiver. Call in an injection context. */
  all(receiverId: () => string) {
    return remote(() => `${plansOf(receiverId())}?pageSize=${MOST}`, pageOf(plan));
  }

  /** One plan; none while its id is undefined. Call in an injection context. */
  one(receiverId: () => string, planId: () => string | undefined): Remote<WholePlan> {
    return remote(() => {
      const id = planId();
      return id === undefined ? undefined : `${plansOf(receiverId())}/${encodeURIComponent(id)}`;
    }, wholePlan);
  }

  async remove(of: Plan): Promise<void> {
    await firstValueFrom(this.http.delete(addressOf(of)));
  }

  async keep(receiverId: number, draft: PlanInput): Promise<WholePlan> {
    const kept = this.http.post(plansOf(String(receiverId)), draft);
    return wholePlan.parse(await firstValueFrom(kept));
  }

  /** Makes a link; the one before it ends. */
  async share(of: Plan): Promise<PlanShare> {
    return planShare.parse(await firstValueFrom(this.http.post(`${addressOf(of)}/share`, null)));
  }

  async unshare(of: Plan): Promise<void> {
    await firstValueFrom(this.http.delete(`${addressOf(of)}/share`));
  }
}

const plansOf = (receiverId: string): string =>
  `/api/receivers/${encodeURIComponent(receiverId)}/plans`;

const addressOf = ({ receiverId, id }: Plan): string => `${plansOf(String(receiverId))}/${id}`;
