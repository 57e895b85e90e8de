import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { type Action, may } from '@ligament/domain/contract/policy';
import type { SessionView } from '@ligament/domain/contract/session';
import { catchError, map, type Observable, of, tap } from 'rxjs';

/** Who is signed in, and what they may do; the server checks every request again. */
@Injectable({ providedIn: 'root' })
export class Session {
  private readonly http = inject(HttpClient);
  private readonly view = signal<SessionView | null>(null);
  private asked = false;

  readonly user = computed(() => this.view()?.user ?? null);
  readonly site = computed(() => this.view()?.site ?? null);

  /** Whether the signed-in person's role may do an action; what one may not do is not offered. */
  can(action: Action): boolean {
    const user = this.user();
    return user !== null && may(user.role, action);
  }

  /** Asks the server once who is signed in. */
  load(): Observable<SessionView | null> {
    if (this.asked) return of(this.view());
    return this.http.get<SessionView>('/api/session').pipe(
      catchError(() => of(null)),
      tap((view) => this.remember(view)),
    );
  }

  signIn(email: string, password: string): Observable<SessionView> {
    return this.http
      .post<SessionView>('/api/session', { email, password })
      .pipe(tap((view) => this.remember(view)));
  }

  signOut(): Observable<void> {
    return this.http.delete('/api/session').pipe(
      map(() => undefined),
      tap(() => this.forget()),
    );
  }

  /** Gives the password again before a sign-off. */
  prove(password: string): Observable<void> {
    return this.http.post('/api/session/proof', { password }).pipe(map(() => undefined));
  }

  remember(view: SessionView | null): void {
    this.asked = true;
    this.view.set(view);
  }

  forget(): void {
    this.view.set(null);
  }
}
