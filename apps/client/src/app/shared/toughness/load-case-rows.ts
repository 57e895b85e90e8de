import {
  governingTemperature,
  type LoadCase,
} from '@ligament/domain/fracture/toughness/governing-temperature';
import { toMPaSqrtM } from '@ligament/domain/units/convert';
import { numberText } from '../quantity/quantity-text';
import type { Evidence, Row } from './evidence';
import type { Column } from './evidence-kinds';
import { judgeEvidence } from './judge-evidence';
import { refusalsInForm } from './refusals-in-form';
import type { RowAnswer } from './rows-field';

export const CASE_COLUMNS: readonly Column[] = [
  { name: 'name', label: 'Load case', kind: 'text' },
  { name: 'temperatureC', label: 'Temperature [°C]', kind: 'number' },
  { name: 'stressFactor', label: 'Stress over that assessed, empty for 1', kind: 'number' },
];

export const rowsOfCases = (cases: readonly LoadCase[]): readonly Row[] =>
  cases.map((each) => ({ ...each }));

/** The toughness of every case, and which one governs once all of them have one. */
export interface RatedCases {
  readonly answers: readonly RowAnswer[];
  readonly messages: ReadonlyMap<string, string>;
  readonly governing: LoadCase | null;
}

export function rateCases(rows: readonly Row[], evidence: Evidence): RatedCases {
  const cases = rows.map(caseOf);
  const rated = governingTemperature(cases, (at) => judgeEvidence(evidence, at));
  const at = rated.status === 'found' ? rated.cases.indexOf(rated.governing) : -1;
  const governing = cases[at] ?? null;
  const answers = cases.map(({ temperatureC }, i) => ({
    text: kMatText(evidence, temperatureC),
    mark: i === at ? 'governs' : '',
  }));
  const refusals = rated.status === 'refused' ? rated.refusals : [];
  const { atFields } = refusalsInForm(
    refusals.filter(({ input }) => OF_CASE.test(input)),
    new Set(),
  );
  return { answers, messages: atFields, governing };
}

// what else a case is refused for stands at the evidence itself
const OF_CASE = /^loadCases\.\d+\.(temperatureC|stressFactor)$/;

const numeric = (value: Row[string] | undefined) =>
  typeof value === 'number' ? value : Number.NaN;

const caseOf = (row: Row, index: number): LoadCase => ({
  name: String(row['name'] || `Load case ${index + 1}`),
  temperatureC: numeric(row['temperatureC']),
  stressFactor: row['stressFactor'] === '' ? 1 : numeric(row['stressFactor'] ?? 1),
});

function kMatText(evidence: Evidence, temperatureC: number): string {
  const result = judgeEvidence(evidence, temperatureC);
  return result.status === 'found'
    ? `${numberText(toMPaSqrtM(result.kMatMPaSqrtMm), 1)} MPa√m`
    : '—';
}
