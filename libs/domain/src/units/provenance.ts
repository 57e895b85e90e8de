/** Where an input comes from, strongest first. One list for type, column, check and select box. */
export const PROVENANCES = [
  'measured',
  'certificate',
  'code minimum',
  'standard default',
  'assumed',
] as const;

/** Where an input comes from. */
export type Provenance = (typeof PROVENANCES)[number];

/** One input with its origin: the value, where it comes from, and the document or reason behind it. */
export interface Given<T = number> {
  readonly value: T;
  readonly provenance: Provenance;
  /** Source document and page, or the reason for an assumption. */
  readonly note: string;
}
