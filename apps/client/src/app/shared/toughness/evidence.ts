import type { LoadCase } from '@ligament/domain/fracture/toughness/governing-temperature';
import type { Given } from '@ligament/domain/units/provenance';
import type { EvidenceKind, ListName, NumberName, WordName } from './evidence-kinds';

export type Row = Readonly<Record<string, number | string | boolean>>;
export type Origin = Pick<Given, 'provenance' | 'note'>;

/** What has been entered, also of the kinds not chosen now. */
export interface Evidence {
  readonly kind: EvidenceKind;
  readonly numbers: Readonly<Partial<Record<NumberName, Given>>>;
  readonly words: Readonly<Record<WordName, string>>;
  readonly lists: Readonly<Record<ListName, readonly Row[]>>;
  /** Where the list comes from. */
  readonly listOrigin: Origin;
}

/** What is known before anything is entered. */
export interface KnownOfToughness {
  readonly numbers: Readonly<Partial<Record<NumberName, Given>>>;
  readonly loadCases?: readonly LoadCase[];
}

const EMPTY: Given = { value: Number.NaN, provenance: 'assumed', note: '' };

export const numberOf = ({ numbers }: Evidence, name: NumberName): Given => numbers[name] ?? EMPTY;

/** A new form: what is known is filled in, the rest is asked. */
export const startOf = ({ numbers }: KnownOfToughness): Evidence => ({
  kind: 'Charpy',
  numbers: { probability: { value: 0.05, provenance: 'assumed', note: '' }, ...numbers },
  words: { from: 'T27J', form: 'BS 7910', shelf: 'yield', curve: 'initiation' },
  lists: { table: [{}, {}], tests: [{}, {}, {}, {}, {}, {}] },
  listOrigin: { provenance: 'assumed', note: '' },
});
