import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { toProblem } from '../../core/api-problem';
import { Session } from '../../core/session/session';
import { formFieldDefaults } from '../../ui/form-field-defaults';

/** Signs the same user in again over the page, so that nothing typed there is lost. */
@Component({
  selector: 'app-renew-session',
  imports: [
    MatButtonModule,
    MatDialogModule,
    MatFormFieldModule,
    MatInputModule,
    ReactiveFormsModule,
  ],
  providers: [formFieldDefaults],
  templateUrl: './renew-session.html',
  styleUrl: './renew-session.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RenewSession {
  private readonly session = inject(Session);
  private readonly dialog = inject<MatDialogRef<RenewSession>>(MatDialogRef);

  protected readonly email = this.session.user()?.email ?? '';
  protected readonly form = inject(NonNullableFormBuilder).group({ password: '' });
  protected readonly problem = signal('');
  protected readonly isBusy = signal(false);

  protected async signIn(): Promise<void> {
    this.isBusy.set(true);
    try {
      await this.session.signIn({ email: this.email, ...this.form.getRawValue() });
      this.dialog.close();
    } catch (error) {
      this.problem.set(toProblem(error).title);
    } finally {
      this.isBusy.set(false);
    }
  }
}
