import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { filter } from 'rxjs';
import { ErrorReporter } from '../errors/error-reporter';
import { Session } from '../session/session';
import { FocusOnNavigation } from './focus-on-navigation';
import { Mark } from './mark';
import { NAVIGATION, NEAREST } from './navigation';
import { SearchBox } from './search-box';
import { THEMES, ThemeChoice } from './theme';

/** The frame around every page of a signed-in person: top bar, rail, page, caution. */
@Component({
  selector: 'app-shell',
  imports: [
    RouterOutlet,
    RouterLink,
    RouterLinkActive,
    MatMenuModule,
    MatButtonModule,
    Mark,
    SearchBox,
  ],
  templateUrl: './shell.html',
  styleUrl: './shell.scss',
  host: { '(document:keydown.escape)': 'railOpen.set(false)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Shell {
  private readonly router = inject(Router);
  protected readonly session = inject(Session);
  protected readonly themeChoice = inject(ThemeChoice);
  protected readonly errors = inject(ErrorReporter);
  protected readonly themes = THEMES;
  protected readonly railOpen = signal(false);

  protected readonly groups = computed(() =>
    NAVIGATION.map((group) => ({
      ...group,
      entries: group.entries.filter(
        (entry) => this.session.user() && this.session.can(entry.action),
      ),
    })).filter((group) => group.entries.length > 0),
  );

  /** On a phone these stay within reach of the thumb. */
  protected readonly nearest = computed(() =>
    NEAREST.filter((entry) => this.session.user() && this.session.can(entry.action)),
  );

  protected readonly initials = computed(() =>
    (this.session.user()?.name ?? '')
      .split(/\s+/)
      .map((word) => word.charAt(0))
      .slice(0, 2)
      .join(''),
  );

  constructor() {
    inject(FocusOnNavigation);
    this.router.events
      .pipe(filter((event) => event instanceof NavigationEnd))
      .subscribe(() => this.railOpen.set(false));
  }

  protected signOut(): void {
    this.session.signOut().subscribe(() => void this.router.navigate(['/sign-in']));
  }
}
