import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { filter, type Observable } from 'rxjs';
import { ConfirmDialog, type ConfirmQuestion } from './confirm-dialog';
import { type ReasonAnswer, ReasonDialog, type ReasonQuestion } from './reason-dialog';

/** Questions to the person; each emits only when answered with yes. */
@Injectable({ providedIn: 'root' })
export class Ask {
  private readonly dialog = inject(MatDialog);

  confirm(question: ConfirmQuestion): Observable<boolean> {
    return this.dialog
      .open<ConfirmDialog, ConfirmQuestion, boolean>(ConfirmDialog, {
        data: question,
        width: '460px',
      })
      .afterClosed()
      .pipe(filter((answer) => answer === true));
  }

  reason(question: ReasonQuestion): Observable<ReasonAnswer> {
    return this.dialog
      .open<ReasonDialog, ReasonQuestion, ReasonAnswer>(ReasonDialog, {
        data: question,
        width: '520px',
      })
      .afterClosed()
      .pipe(filter((answer) => answer !== undefined));
  }
}
