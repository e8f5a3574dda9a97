import { HttpClient, HttpErrorResponse } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { firstValueFrom, type Observable } from 'rxjs';

import {
  type AccountDraft,
  type Credentials,
  type SessionChange,
  type User,
  user,
} from '../../../../shared/contracts/session';

/** Who is signed in. Every verb rejects with the server's problem. */
@Injectable({ providedIn: 'root' })
export class Session {
  private readonly http = inject(HttpClient);
  private readonly current = signal<User | null>(null);
  private readonly lapsed = signal(false);
  private asked: Promise<void> | undefined;

  readonly user = this.current.asReadonly();
  readonly isSignedIn = computed(() => this.current() !== null);
  /** The server has ended the session of someone still at work here. */
  readonly hasLapsed = this.lapsed.asReadonly();

  /** Asks the server once who is signed in; asks again only after a failure. */
  ready(): Promise<void> {
    this.asked ??= this.load().catch((error: unknown) => {
      this.asked = undefined;
      throw error;
    });
    return this.asked;
  }

  signIn(credentials: Credentials): Promise<void> {
    return this.enter(this.http.post('/api/session', credentials));
  }

  register(draft: AccountDraft): Promise<void> {
    return this.enter(this.http.post('/api/accounts', draft));
  }

  enterWorkshop(change: SessionChange): Promise<void> {
    return this.enter(this.http.put('/api/session', change));
  }

  async signOut(): Promise<void> {
    await firstValueFrom(this.http.delete('/api/session'));
    this.current.set(null);
  }

  /** Called when the server no longer knows us; the user stays, so that work can go on. */
  lapse(): void {
    if (this.isSignedIn()) this.lapsed.set(true);
  }

  private async load(): Promise<void> {
    try {
      await this.enter(this.http.get('/api/session'));
    } catch (error) {
      if (!(error instanceof HttpErrorResponse && error.status === 401)) throw error;
    }
  }

  private async enter(call: Observable<unknown>): Promise<void> {
    this.current.set(user.parse(await firstValueFrom(call)));
    this.lapsed.set(false);
  }
}
