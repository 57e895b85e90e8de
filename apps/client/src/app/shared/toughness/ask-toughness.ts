import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { filter, type Observable } from 'rxjs';
import type { KnownOfToughness } from './evidence';
import type { ToughnessAnswer } from './toughness-answer';
import { ToughnessDialog } from './toughness-dialog';

/** Asks what a toughness is known from; emits only when a value is taken. */
@Injectable({ providedIn: 'root' })
export class AskToughness {
  private readonly dialog = inject(MatDialog);

  ask(known: KnownOfToughness): Observable<ToughnessAnswer> {
    return this.dialog
      .open<ToughnessDialog, KnownOfToughness, ToughnessAnswer>(ToughnessDialog, {
        data: known,
        width: '820px',
        maxWidth: '96vw',
      })
      .afterClosed()
      .pipe(filter((answer) => answer !== undefined));
  }
}
