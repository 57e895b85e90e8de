import { DOCUMENT, effect, inject, Injectable, signal } from '@angular/core';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];
const KEY = 'ligament.theme';

/** Light or dark, by the system's setting or by choice; the only thing kept in the browser's storage. */
@Injectable({ providedIn: 'root' })
export class ThemeChoice {
  private readonly document = inject(DOCUMENT);
  readonly theme = signal<Theme>(this.kept());

  constructor() {
    effect(() => {
      const theme = this.theme();
      if (theme === 'system') delete this.document.documentElement.dataset['theme'];
      else this.document.documentElement.dataset['theme'] = theme;
      this.document.defaultView?.localStorage.setItem(KEY, theme);
    });
  }

  private kept(): Theme {
    const kept = this.document.defaultView?.localStorage.getItem(KEY);
    return THEMES.find((theme) => theme === kept) ?? 'system';
  }
}
