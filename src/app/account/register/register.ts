import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';

import { accountDraft } from '../../../../shared/contracts/session';
import { toProblem } from '../../core/api-problem';
import { Session } from '../../core/session/session';
import { needed } from '../../ui/form-problems/form-issues';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';

/** Makes an account with a workshop of its own, signed in at once. */
@Component({
  selector: 'app-register',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './register.html',
  styleUrl: '../account-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Register {
  private readonly session = inject(Session);
  private readonly router = inject(Router);

  /** Address asked for before registering. */
  readonly next = input<string>();

  protected readonly isPasswordShown = signal(false);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', needed($localize`Give your e-mail address.`)],
    name: ['', needed($localize`Give your name.`)],
    password: ['', needed($localize`Give a password.`)],
  });
  protected readonly submission = new Submission(this.form, accountDraft, toProblem);

  protected async register(): Promise<void> {
    const done = await this.submission.send(this.form.getRawValue(), async (valid) => {
      await this.session.register(valid);
      return true;
    });
    if (done) await this.router.navigateByUrl(this.next() ?? '/receivers');
  }
}
