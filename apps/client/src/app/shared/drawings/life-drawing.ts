/** One measured size of the flaw with its sizing error. */
export interface MeasuredSize {
  readonly on: string;
  readonly heightMm: number;
  readonly errorMm: number;
  readonly label: string;
}

export interface DatedHeight {
  readonly on: string;
  readonly heightMm: number;
}

export interface NamedDay {
  readonly on: string;
  readonly label: string;
}

export interface NamedSpan {
  readonly startsOn: string;
  readonly endsOn: string;
  readonly label: string;
}

/** What a life line draws: sizes measured, growth predicted, its limit, and the days that matter. */
export interface LifeDrawing {
  readonly wallMm: number;
  /** What is drawn: depth of a flaw that opens to a face, height of an embedded one, length of one through the wall. */
  readonly quantity: 'depth' | 'height' | 'length';
  readonly measured: readonly MeasuredSize[];
  readonly predicted: readonly DatedHeight[];
  readonly limitMm: number | null;
  readonly limit: NamedDay | null;
  readonly due: (NamedDay & { readonly basis: string }) | null;
  readonly windows: readonly NamedSpan[];
  readonly events: readonly NamedDay[];
  readonly today: string;
}
