import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

/** Takes one file, dropped or chosen; works with the keyboard through the button. */
@Component({
  selector: 'app-file-drop',
  imports: [MatButtonModule],
  template: `
    <div
      class="drop"
      [class.over]="over()"
      (dragover)="$event.preventDefault(); over.set(true)"
      (dragleave)="over.set(false)"
      (drop)="dropped($event)"
    >
      <p>{{ label() }}</p>
      <button mat-stroked-button type="button" (click)="file.click()">Choose a file</button>
      <input
        #file
        type="file"
        class="visually-hidden"
        tabindex="-1"
        [accept]="accept()"
        [attr.aria-label]="label()"
        (change)="chosen()"
      />
      <p class="caption">{{ hint() }}</p>
    </div>
  `,
  styles: `
    .drop {
      border: 1px dashed var(--rule-strong);
      border-radius: var(--radius);
      padding: 20px;
      text-align: center;
      background: var(--sheet-2);
    }
    .over {
      border-color: var(--steel);
      background: var(--steel-soft);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FileDrop {
  readonly label = input('Drop a file here, or');
  readonly hint = input('');
  readonly accept = input('');
  readonly picked = output<File>();
  protected readonly over = signal(false);
  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('file');

  protected chosen(): void {
    const field = this.field().nativeElement;
    const file = field.files?.[0];
    field.value = '';
    if (file) this.picked.emit(file);
  }

  protected dropped(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    const file = event.dataTransfer?.files[0];
    if (file) this.picked.emit(file);
  }
}
