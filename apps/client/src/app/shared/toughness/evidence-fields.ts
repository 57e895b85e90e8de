import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { type Given, PROVENANCES } from '@ligament/domain/units/provenance';
import { type Evidence, numberOf, type Row } from './evidence';
import {
  kindWords,
  LISTS,
  type ListName,
  type NumberName,
  type WordName,
  WORDS,
  wordsOf,
} from './evidence-kinds';
import { RowsField } from './rows-field';

/** The fields one kind of evidence needs, each with its unit and its origin. */
@Component({
  selector: 'app-evidence-fields',
  imports: [RowsField],
  templateUrl: './evidence-fields.html',
  styleUrl: './toughness.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EvidenceFields {
  readonly evidence = input.required<Evidence>();
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  readonly changed = output<Evidence>();

  protected readonly provenances = PROVENANCES;
  protected readonly allWords = WORDS;
  protected readonly lists = LISTS;
  protected readonly words = wordsOf;
  protected readonly kind = computed(() => kindWords(this.evidence().kind));
  protected readonly numbers = computed<readonly NumberName[]>(() => [
    'temperatureC',
    ...this.kind().numbers,
  ]);

  protected given(name: NumberName): Given {
    return numberOf(this.evidence(), name);
  }

  protected text(name: NumberName): string {
    const { value } = this.given(name);
    return Number.isNaN(value) ? '' : String(value);
  }

  protected set(name: NumberName, change: Partial<Record<keyof Given, unknown>>): void {
    const numbers = { ...this.evidence().numbers, [name]: { ...this.given(name), ...change } };
    this.changed.emit({ ...this.evidence(), numbers });
  }

  protected choose(name: WordName, word: string): void {
    this.changed.emit({ ...this.evidence(), words: { ...this.evidence().words, [name]: word } });
  }

  protected setList(name: ListName, rows: readonly Row[]): void {
    this.changed.emit({ ...this.evidence(), lists: { ...this.evidence().lists, [name]: rows } });
  }

  protected setOrigin(provenance: string, note: string): void {
    const listOrigin = { provenance: provenance as Given['provenance'], note };
    this.changed.emit({ ...this.evidence(), listOrigin });
  }
}
