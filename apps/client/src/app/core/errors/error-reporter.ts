import { type ErrorHandler, inject, Injectable, signal } from '@angular/core';
import { LiveAnnouncer } from '@angular/cdk/a11y';

/** Shows an unexpected error of the page itself in one place, instead of failing in silence. */
@Injectable({ providedIn: 'root' })
export class ErrorReporter implements ErrorHandler {
  private readonly announcer = inject(LiveAnnouncer);
  readonly last = signal<string | null>(null);

  handleError(error: unknown): void {
    const words = error instanceof Error ? error.message : String(error);
    this.last.set(words);
    void this.announcer.announce('Something on this page went wrong.', 'assertive');
    // eslint-disable-next-line no-console -- the browser's console is where a developer looks
    console.error(error);
  }

  dismiss(): void {
    this.last.set(null);
  }
}
