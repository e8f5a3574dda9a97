import { DatePipe, DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { Icon } from '../../../ui/icon/icon';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { PlansStore } from '../plans-store';

/** Makes and ends the link by which anyone can read a plan. */
@Component({
  selector: 'app-share-plan',
  templateUrl: './share-plan.html',
  styleUrl: './share-plan.scss',
  imports: [DatePipe, Icon, MatButtonModule, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SharePlan {
  private readonly store = inject(PlansStore);
  private readonly document = inject(DOCUMENT);

  readonly plan = input.required<Plan>();
  /** The link was made or ended: the plan must be read anew. */
  readonly changed = output();

  /** Only known right after it was made: the server keeps no more than a hash. */
  protected readonly link = signal<string | null>(null);
  protected readonly said = signal('');
  protected readonly isBusy = signal(false);
  protected readonly refusal = signal<Problem | null>(null);

  protected share(): Promise<void> {
    return this.change(async () => {
      const { token } = await this.store.share(this.plan());
      this.link.set(`${this.document.location.origin}/shared/${token}`);
      this.said.set($localize`The link is made.`);
    });
  }

  protected revoke(): Promise<void> {
    return this.change(async () => {
      await this.store.unshare(this.plan());
      this.link.set(null);
      this.said.set($localize`The link has ended: whoever opens it finds nothing.`);
    });
  }

  protected async copy(field: HTMLInputElement): Promise<void> {
    field.select();
    try {
      await this.document.defaultView?.navigator.clipboard.writeText(field.value);
      this.said.set($localize`The link is copied.`);
    } catch {
      this.said.set($localize`The link is selected: copy it by hand.`);
    }
  }

  private async change(call: () => Promise<void>): Promise<void> {
    this.isBusy.set(true);
    this.refusal.set(null);
    this.said.set('');
    try {
      await call();
      this.changed.emit();
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
    this.isBusy.set(false);
  }
}
