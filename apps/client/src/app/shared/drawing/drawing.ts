import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { saveText } from '../files/save-text';
import { csvText } from '../table/csv-text';
import { standaloneSvg } from './standalone-svg';
import { cellText, headingOf, type TwinTable } from './twin-table';

let drawings = 0;

/**
 * The frame of a drawing: what it shows, the same numbers as a table, and both as a file.
 * Its content is an app-chart or a hand-drawn svg.
 */
@Component({
  selector: 'app-drawing',
  templateUrl: './drawing.html',
  styleUrl: './drawing.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Drawing {
  readonly heading = input.required<string>();
  /** Beside the heading: what is drawn, from where, with which option. */
  readonly caption = input('');
  readonly table = input<TwinTable>();
  /** Name of an exported file, without its ending. */
  readonly name = input('drawing');

  protected readonly titleId = `drawing-${++drawings}`;
  protected readonly asTable = signal(false);
  protected readonly headingOf = headingOf;
  protected readonly cellText = cellText;
  private readonly drawn = viewChild.required<ElementRef<HTMLElement>>('drawn');

  /** Whether a column holds numbers: the first row that has a value decides. */
  protected isNumber(column: number): boolean {
    const rows = this.table()?.rows ?? [];
    return typeof rows.find((row) => (row[column] ?? null) !== null)?.[column] === 'number';
  }

  protected saveCsv(): void {
    const table = this.table();
    if (!table) return;
    const text = csvText(table.columns.map(headingOf), table.rows);
    saveText(`${this.name()}.csv`, 'text/csv;charset=utf-8', text);
  }

  protected saveSvg(): void {
    const svg = this.drawn().nativeElement.querySelector('svg');
    if (svg) saveText(`${this.name()}.svg`, 'image/svg+xml', standaloneSvg(svg));
  }
}
