import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';

import { credentials } from '../../../../shared/contracts/session';
import { toProblem } from '../../core/api-problem';
import { OWN_MACHINE } from '../../core/own-machine';
import { Session } from '../../core/session/session';
import { needed } from '../../ui/form-problems/form-issues';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';

/** Signs in, then goes where the user wanted to go. */
@Component({
  selector: 'app-sign-in',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './sign-in.html',
  styleUrl: '../account-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignIn {
  private readonly session = inject(Session);
  private readonly router = inject(Router);

  /** Address asked for before signing in. */
  readonly next = input<string>();

  protected readonly isPasswordShown = signal(false);
  protected readonly isOwnMachine = inject(OWN_MACHINE);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', needed($localize`Give your e-mail address.`)],
    password: ['', needed($localize`Give your password.`)],
  });
  protected readonly submission = new Submission(this.form, credentials, toProblem);

  protected async signIn(): Promise<void> {
    const done = await this.submission.send(this.form.getRawValue(), async (valid) => {
      await this.session.signIn(valid);
      return true;
    });
    if (done) await this.router.navigateByUrl(this.next() ?? '/receivers');
  }
}
