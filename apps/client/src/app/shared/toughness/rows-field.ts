import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { Row } from './evidence';
import type { Column } from './evidence-kinds';

/** What is said at the end of a row. */
export interface RowAnswer {
  readonly text: string;
  readonly mark: string;
}

/** A list that is filled in row by row, with an answer behind each row where there is one. */
@Component({
  selector: 'app-rows-field',
  templateUrl: './rows-field.html',
  styleUrl: './toughness.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RowsField {
  readonly name = input.required<string>();
  readonly label = input.required<string>();
  readonly columns = input.required<readonly Column[]>();
  readonly rows = input.required<readonly Row[]>();
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  /** Heading of the answers; without one there is no column for them. */
  readonly answer = input('');
  readonly answers = input<readonly RowAnswer[]>([]);
  readonly changed = output<readonly Row[]>();

  protected path(index: number, column: string): string {
    return `${this.name()}.${index}.${column}`;
  }

  protected messagesOf(index: number): readonly string[] {
    const start = `${this.name()}.${index}.`;
    return [...this.messages()]
      .filter(([path]) => path.startsWith(start))
      .map(([, words]) => words);
  }

  protected set(index: number, { name, kind }: Column, field: HTMLInputElement): void {
    const numeric = Number.isNaN(field.valueAsNumber) ? '' : field.valueAsNumber;
    const value = { flag: field.checked, text: field.value, number: numeric }[kind];
    this.changed.emit(this.rows().map((row, i) => (i === index ? { ...row, [name]: value } : row)));
  }

  protected add(): void {
    this.changed.emit([...this.rows(), {}]);
  }

  protected remove(index: number): void {
    this.changed.emit(this.rows().filter((_, i) => i !== index));
  }
}
