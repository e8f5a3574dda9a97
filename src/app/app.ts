import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  effect,
  type ElementRef,
  inject,
  signal,
  viewChild,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { filter, map, pairwise } from 'rxjs';

import type { Problem } from '../../shared/contracts/problem';
import { toProblem } from './core/api-problem';
import { Preferences } from './core/preferences';
import { Session } from './core/session/session';
import { AccountMenu } from './shell/account-menu/account-menu';
import { openRenewal } from './shell/open-renewal';
import { ProblemNote } from './ui/page-state/problem-note';

/** The frame around every page. */
@Component({
  selector: 'app-root',
  imports: [AccountMenu, ProblemNote, RouterLink, RouterLinkActive, RouterOutlet],
  templateUrl: './app.html',
  styleUrl: './app.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {
  private readonly router = inject(Router);
  private readonly renew = openRenewal();
  protected readonly session = inject(Session);

  private readonly content = viewChild.required<ElementRef<HTMLElement>>('content');

  protected readonly isAsking = signal(true);
  protected readonly problem = signal<Problem | null>(null);

  constructor() {
    inject(Preferences);
    void this.askWhoIsSignedIn();
    effect(() => {
      if (this.session.hasLapsed()) void this.renew();
    });
    this.focusOnNewPage(inject(DestroyRef));
  }

  protected async askWhoIsSignedIn(): Promise<void> {
    this.problem.set(null);
    await this.session.ready().catch((error: unknown) => {
      this.problem.set(toProblem(error));
    });
    this.isAsking.set(false);
  }

  protected skip(event: Event): void {
    event.preventDefault();
    this.content().nativeElement.focus();
  }

  /** Takes keyboard and screen reader to the new page, but not when only its query changes. */
  private focusOnNewPage(destroyRef: DestroyRef): void {
    this.router.events
      .pipe(
        filter((event) => event instanceof NavigationEnd),
        map(({ urlAfterRedirects }) => urlAfterRedirects.split(/[?#]/u)[0]),
        pairwise(),
        filter(([from, to]) => from !== to),
        takeUntilDestroyed(destroyRef),
      )
      .subscribe(() => {
        this.content().nativeElement.focus({ preventScroll: true });
      });
  }
}
