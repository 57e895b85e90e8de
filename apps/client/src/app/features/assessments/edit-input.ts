import type { AssessmentInput, WallInput } from '@ligament/domain/assessment/assessment-input';
import type { Given } from '@ligament/domain/units/provenance';

/** Reads the member at a path, e.g. `material.yieldMPa`; undefined where the case has none. */
export function valueAt(input: AssessmentInput, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>((data, name) => (isRecord(data) ? data[name] : undefined), input);
}

/** A copy of the input with another member at a path. */
export function setAt(input: AssessmentInput, path: string, value: unknown): AssessmentInput {
  return change(input, path.split('.'), value) as AssessmentInput;
}

function change(data: unknown, [name, ...rest]: readonly string[], value: unknown): unknown {
  if (name === undefined) return value;
  if (Array.isArray(data)) {
    return data.map((each: unknown, i) => (String(i) === name ? change(each, rest, value) : each));
  }
  const record = isRecord(data) ? data : {};
  return { ...record, [name]: change(record[name], rest, value) };
}

const isRecord = (data: unknown): data is Readonly<Record<string, unknown>> =>
  typeof data === 'object' && data !== null;

/** An input nobody has given yet: empty, so that nothing is computed with it. */
const empty = (note = ''): Given => ({ value: Number.NaN, provenance: 'assumed', note });

/**
 * A copy of the input with another word chosen; members that the other case needs come from the register where it has
 * them, and are left empty where it has not.
 */
export function choose(
  input: AssessmentInput,
  path: string,
  word: string,
  register: AssessmentInput | null,
): AssessmentInput {
  switch (path) {
    case 'wall.shape':
      return { ...input, wall: wallOf(input, word, register) };
    case 'flaw.kind': {
      const embedded = word === 'embedded';
      const known = register?.flaw.ligamentMm ?? null;
      return {
        ...input,
        flaw: {
          ...input.flaw,
          kind: embedded ? 'embedded' : 'surface',
          ligamentMm: embedded ? (input.flaw.ligamentMm ?? known ?? empty()) : null,
        },
      };
    }
    case 'stress.residual.state':
      return setAt(input, 'stress.residual', residualOf(word));
    default:
      return setAt(input, path, word);
  }
}

function wallOf(
  { wall }: AssessmentInput,
  shape: string,
  register: AssessmentInput | null,
): WallInput {
  const { thicknessMm } = wall;
  if (shape === 'plate') return { shape: 'plate', thicknessMm, widthMm: null };
  const known = register?.wall.shape === 'cylinder' ? register.wall.insideDiameterMm : empty();
  return { shape: 'cylinder', thicknessMm, insideDiameterMm: known };
}

function residualOf(state: string): AssessmentInput['stress']['residual'] {
  switch (state) {
    case 'entered':
      return { state, membraneMPa: empty(), bendingMPa: empty() };
    case 'heat-treated':
      return { state, flawToWeld: 'parallel' };
    case 'as-welded':
      return { state };
    default:
      return { state: 'none' };
  }
}

/** Puts an input in that may also be left out, or takes it out. */
export const include = (
  input: AssessmentInput,
  path: string,
  included: boolean,
  register: AssessmentInput | null,
): AssessmentInput =>
  setAt(input, path, included ? (given(register && valueAt(register, path)) ?? empty()) : null);

/** The member as an input with its origin; null where it is none. */
export function given(value: unknown): Given | null {
  return isRecord(value) && 'provenance' in value ? (value as unknown as Given) : null;
}
