import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { toMPaSqrtM } from '@ligament/domain/units/convert';
import { ProvenanceMark } from '../provenance/provenance-mark';
import { numberText } from '../quantity/quantity-text';
import { type Evidence, type KnownOfToughness, numberOf, type Row, startOf } from './evidence';
import { EvidenceFields } from './evidence-fields';
import { type EvidenceKind, KINDS, kindWords, type NumberName, wordsOf } from './evidence-kinds';
import { judgeEvidence, refusalsOf } from './judge-evidence';
import { CASE_COLUMNS, rateCases, rowsOfCases } from './load-case-rows';
import { refusalsInForm } from './refusals-in-form';
import { RowsField } from './rows-field';
import { answerOf, type ToughnessAnswer } from './toughness-answer';

/** Finds a fracture toughness from the evidence there is; closes with the value, its origin and its temperature. */
@Component({
  selector: 'app-toughness-dialog',
  imports: [MatDialogModule, MatButtonModule, EvidenceFields, RowsField, ProvenanceMark],
  templateUrl: './toughness-dialog.html',
  styleUrl: './toughness.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ToughnessDialog {
  private readonly known = inject<KnownOfToughness>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<ToughnessDialog, ToughnessAnswer>>(MatDialogRef);

  protected readonly kinds = Object.keys(KINDS) as EvidenceKind[];
  protected readonly kindWords = kindWords;
  protected readonly caseColumns = CASE_COLUMNS;
  protected readonly figure = (value: number | string) =>
    typeof value === 'number' ? numberText(value, 2) : value;
  protected readonly evidence = signal<Evidence>(startOf(this.known));
  protected readonly cases = signal<readonly Row[]>(rowsOfCases(this.known.loadCases ?? []));

  private readonly temperatureC = computed(() => numberOf(this.evidence(), 'temperatureC').value);
  protected readonly result = computed(() => judgeEvidence(this.evidence(), this.temperatureC()));
  protected readonly found = computed(() => {
    const result = this.result();
    return result.status === 'found' ? result : null;
  });
  protected readonly kMat = computed(() => {
    const found = this.found();
    return found ? numberText(toMPaSqrtM(found.kMatMPaSqrtMm), 1) : '';
  });
  protected readonly refusals = computed(() => {
    const { numbers, list } = kindWords(this.evidence().kind);
    const fields = new Set<string>(['temperatureC', ...numbers, ...(list ? [list] : [])]);
    return refusalsInForm(refusalsOf(this.evidence(), this.temperatureC()), fields);
  });
  protected readonly missing = computed(() => {
    const noTemperature = Number.isNaN(this.temperatureC()) ? ['temperatureC'] : [];
    const names = [...new Set([...noTemperature, ...this.refusals().missing])];
    const inLists = names.some((name) => /\.\d+\./.test(name))
      ? ['the empty cells of the list']
      : [];
    const labels = names.filter((name) => !/\.\d+\./.test(name));
    return [...labels.map((name) => wordsOf(name as NumberName).label), ...inLists].join(', ');
  });
  protected readonly rated = computed(() => rateCases(this.cases(), this.evidence()));

  protected chooseKind(kind: string): void {
    this.evidence.update((each) => ({ ...each, kind: kind as EvidenceKind }));
  }

  /** Takes the temperature of the load case that governs. */
  protected take(temperatureC: number): void {
    this.evidence.update((each) => {
      const at = { ...numberOf(each, 'temperatureC'), value: temperatureC };
      return { ...each, numbers: { ...each.numbers, temperatureC: at } };
    });
  }

  protected use(): void {
    const found = this.found();
    if (found) this.dialog.close(answerOf(found));
  }
}
