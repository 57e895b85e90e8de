import type { AssessmentInput, WallInput } from '@ligament/domain/assessment/assessment-input';
import { FLAW_KINDS, KINDS_OF_WALL } from '@ligament/domain/geometry/flaw-kind';
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

/** A stress through the wall nobody has given yet. */
export const emptyProfile = (): Given<readonly number[]> => ({
  value: [Number.NaN],
  provenance: 'assumed',
  note: '',
});

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
    case 'wall.shape': {
      const wall = wallOf(input, word, register);
      const kinds = KINDS_OF_WALL[wall.shape];
      const kept = kinds.includes(input.flaw.kind) ? input.flaw.kind : (kinds[0] ?? 'surface');
      return ofKind({ ...input, wall }, kept, register);
    }
    case 'flaw.kind':
      return ofKind(input, word, register);
    case 'stress.residual.state':
      return setAt(input, 'stress.residual', residualOf(word));
    default:
      return setAt(input, path, word);
  }
}

function ofKind(
  input: AssessmentInput,
  word: string,
  register: AssessmentInput | null,
): AssessmentInput {
  const kind = FLAW_KINDS.find((each) => each === word) ?? input.flaw.kind;
  const known = register?.flaw.ligamentMm ?? null;
  const ligamentMm = kind === 'embedded' ? (input.flaw.ligamentMm ?? known ?? empty()) : null;
  return { ...input, flaw: { ...input.flaw, kind, ligamentMm } };
}

function wallOf(
  { wall }: AssessmentInput,
  shape: string,
  register: AssessmentInput | null,
): WallInput {
  const { thicknessMm } = wall;
  const known = register?.wall;
  const holeRadiusMm = known && 'holeRadiusMm' in known ? known.holeRadiusMm : empty();
  switch (shape) {
    case 'plate':
    case 'round bar':
      return shape === 'plate' ? { shape, thicknessMm, widthMm: null } : { shape, thicknessMm };
    case 'hole edge':
      return { shape, thicknessMm, holeRadiusMm, widthMm: null, flawedSides: 'one' };
    case 'nozzle corner':
      return { shape, thicknessMm, holeRadiusMm };
    default: {
      const round = [wall, known].find((each) => each && 'insideDiameterMm' in each);
      const insideDiameterMm =
        round && 'insideDiameterMm' in round ? round.insideDiameterMm : empty();
      return { shape: shape === 'sphere' ? 'sphere' : 'cylinder', thicknessMm, insideDiameterMm };
    }
  }
}

function residualOf(state: string): AssessmentInput['stress']['residual'] {
  switch (state) {
    case 'entered':
    case 'proof-tested':
      return { state, membraneMPa: empty(), bendingMPa: empty() };
    case 'profile':
      return { state, profileMPa: emptyProfile() };
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
): AssessmentInput => {
  // an optional member of an optional group goes with its group
  const whole = path.startsWith('stress.weldToe.') && !included ? 'stress.weldToe' : path;
  const known = given(register && valueAt(register, path));
  return setAt(input, whole, included ? (known ?? empty()) : null);
};

/** The member as an input with its origin; null where it is none. */
export function given(value: unknown): Given | null {
  return isRecord(value) && 'provenance' in value ? (value as unknown as Given) : null;
}
