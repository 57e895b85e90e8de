/** What a plain field of a record holds. */
export type FieldValue = string | number | boolean | null;

export interface Choice {
  readonly value: FieldValue;
  readonly label: string;
}

/** One field of a record's form. Its check is the contract's, by its name. */
export interface RecordField {
  readonly name: string;
  /** With the unit: `Nominal wall, mm`. */
  readonly label: string;
  readonly kind: 'text' | 'number' | 'date' | 'choice' | 'prose' | 'flag';
  readonly choices?: readonly Choice[];
  /** Whether the field also asks where its value comes from. */
  readonly origin?: boolean;
  /** Whether it takes the whole width. */
  readonly wide?: boolean;
}

/** Words as choices that say what they mean. */
export const choicesOf = (words: readonly string[]): readonly Choice[] =>
  words.map((word) => ({ value: word, label: word }));

export const text = (name: string, label: string): RecordField => ({ name, label, kind: 'text' });
export const number = (name: string, label: string): RecordField => ({
  name,
  label,
  kind: 'number',
});
export const date = (name: string, label: string): RecordField => ({ name, label, kind: 'date' });
export const prose = (name: string, label: string): RecordField => ({
  name,
  label,
  kind: 'prose',
  wide: true,
});
export const choice = (name: string, label: string, choices: readonly Choice[]): RecordField => ({
  name,
  label,
  kind: 'choice',
  choices,
});
/** A number that says where it comes from. */
export const given = (name: string, label: string): RecordField => ({
  name,
  label,
  kind: 'number',
  origin: true,
});
