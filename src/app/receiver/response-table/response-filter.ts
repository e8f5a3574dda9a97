import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatChipsModule } from '@angular/material/chips';

import { type Cause } from '../../charts/cause-mark';
import { CauseSign } from '../../charts/cause-sign';
import { type causesHeard } from './response-rows';

/** Which causes are listed, and whether what is hidden is. */
@Component({
  selector: 'app-response-filter',
  template: `
    <mat-chip-listbox
      multiple
      aria-label="Heard as"
      i18n-aria-label
      [value]="causes()"
      (change)="causes.set($event.value ?? [])"
    >
      @for (each of heard(); track each.look.cause) {
        <mat-chip-option [value]="each.look.cause">
          <app-cause-sign [look]="each.look" />
          {{ each.look.label }} {{ each.count }}
        </mat-chip-option>
      }
    </mat-chip-listbox>
    <mat-checkbox [checked]="isHiddenShown()" (change)="isHiddenShown.set($event.checked)" i18n>
      What is hidden as well
    </mat-checkbox>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 4px 16px;
      margin-bottom: 8px;
    }
  `,
  imports: [CauseSign, MatCheckboxModule, MatChipsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResponseFilter {
  readonly heard = input.required<ReturnType<typeof causesHeard>>();
  /** None chosen: all. */
  readonly causes = model.required<readonly Cause[]>();
  readonly isHiddenShown = model.required<boolean>();
}
