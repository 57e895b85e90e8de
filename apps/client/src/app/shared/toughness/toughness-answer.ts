import type { FoundToughness } from '@ligament/domain/fracture/toughness/toughness-result';
import { toMPaSqrtM } from '@ligament/domain/units/convert';
import type { Given } from '@ligament/domain/units/provenance';

const FIGURES = 3;
const LONGEST_NOTE = 500;

/** The value that is taken over, and the temperature it holds at. */
export interface ToughnessAnswer {
  /** Kmat [MPa·√m]. */
  readonly given: Given;
  readonly temperatureC: number;
}

/** Rounded downwards to three significant figures: never tougher than found. */
export function roundedDown(value: number): number {
  // a value the conversion left a hair below a round one is the round one
  const exact = Number(value.toPrecision(12));
  const step = 10 ** (Math.floor(Math.log10(exact)) + 1 - FIGURES);
  return Number((Math.floor(Number((exact / step).toPrecision(12))) * step).toPrecision(FIGURES));
}

/** What is handed to the field that asked. */
export function answerOf(found: FoundToughness): ToughnessAnswer {
  const { method, source, temperatureC, provenance } = found;
  const note = `${method} at ${temperatureC} °C; ${source}`;
  return {
    given: {
      value: roundedDown(toMPaSqrtM(found.kMatMPaSqrtMm)),
      provenance,
      note: note.length > LONGEST_NOTE ? `${note.slice(0, LONGEST_NOTE - 1)}…` : note,
    },
    temperatureC,
  };
}
