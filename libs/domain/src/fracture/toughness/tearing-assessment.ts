import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { kFromJ } from '../../materials/toughness/from-fracture-test';
import { findMaximum } from '../../numerics/find-maximum';
import type { DiagramLine, LinePoint } from '../fad/diagram-line';
import { reserveOnLoad } from '../fad/reserve-on-load';
import { toughnessRatio } from '../fad/toughness-ratio';
import { tearingResistance, type TearingCurve } from './tearing-resistance';
import { rule } from './toughness-rules';

/** What a crack sees at the present load, after it has torn by an extension. */
export interface TornState {
  /** K of primary and of secondary stress [MPa·√mm]. */
  readonly kPrimary: number;
  readonly kSecondary: number;
  readonly lr: number;
}

/** A crack assessed with credit for tearing. */
export interface TearingInput {
  readonly curve: TearingCurve;
  readonly youngsModulusMPa: number;
  readonly poissonsRatio: number;
  readonly line: DiagramLine;
  /** State after an extension [mm]; the crack has grown by it. */
  readonly stateAt: (extensionMm: number) => TornState;
}

/** One point of the locus: the diagram at the present load after an extension. */
export interface LocusPoint extends LinePoint {
  readonly extensionMm: number;
}

/** The locus of a tearing crack and its reserve. */
export interface TearingAssessment {
  readonly status: 'found';
  readonly locus: readonly LocusPoint[];
  /** Greatest factor on the primary load at which the locus still touches the line. */
  readonly reserveOnLoad: number;
  /** Extension at which it does [mm]. */
  readonly extensionMm: number;
  readonly end: 'tangent' | 'valid extension';
}

const POINTS = 24;
const SMALLEST_SHARE = 1e-3;

/**
 * Tearing on the diagram: with the extension the resistance rises and so does the crack. The load at which the
 * locus of points only just touches the line is the load of instability (R6, BS 7910 tearing analysis, from
 * memory). Secondary stress is not scaled.
 */
export function tearingAssessment(input: TearingInput): TearingAssessment | Refused {
  const { curve, youngsModulusMPa, poissonsRatio } = input;
  const { coefficient, exponent, validToMm } = curve;
  const refusals = outOfBounds([
    rule('tearingCoefficient', 'curve.coefficient', coefficient),
    rule('tearingExponent', 'curve.exponent', exponent),
    { ...rule('extension', 'curve.validToMm', validToMm), above: true },
    rule('modulus', 'youngsModulusMPa', youngsModulusMPa),
    rule('poisson', 'poissonsRatio', poissonsRatio),
    ...[0, validToMm].flatMap((extension) => stateRules(input.stateAt(extension))),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const shareOf = (u: number) => validToMm * Math.exp(u);
  const first = Math.log(SMALLEST_SHARE);
  const top = findMaximum((u) => factorAt(input, shareOf(u)), first, 0);
  const locus = Array.from({ length: POINTS + 1 }, (_, i) =>
    pointAt(input, shareOf(first * (1 - i / POINTS))),
  );
  return {
    status: 'found',
    locus,
    reserveOnLoad: top.value,
    extensionMm: shareOf(top.x),
    end: top.x < -1e-6 ? 'tangent' : 'valid extension',
  };
}

const stateRules = ({ kPrimary, kSecondary, lr }: TornState): readonly NumberRule[] => [
  { ...STATE, name: 'K of primary stress', unit: 'MPa·√mm', value: kPrimary, min: 0, above: true },
  { ...STATE, name: 'K of secondary stress', unit: 'MPa·√mm', value: kSecondary, min: -1e6 },
  { ...STATE, name: 'Load ratio Lr', unit: '', value: lr, min: 0 },
];

const STATE = {
  input: 'stateAt',
  max: 1e6,
  instead: 'A tearing crack is opened by a primary stress, before and after it has torn.',
} as const;

/** Toughness after an extension [MPa·√mm]. */
const toughnessAt = ({ curve, youngsModulusMPa, poissonsRatio }: TearingInput, extension: number) =>
  kFromJ(tearingResistance(curve, extension), youngsModulusMPa, poissonsRatio);

function pointAt(input: TearingInput, extensionMm: number): LocusPoint {
  const state = input.stateAt(extensionMm);
  const kr = toughnessRatio({ ...state, toughness: toughnessAt(input, extensionMm) });
  return { extensionMm, lr: state.lr, kr };
}

/** Factor on the primary load that brings one point of the locus to the line. */
function factorAt(input: TearingInput, extensionMm: number): number {
  const { line } = input;
  const { kPrimary, kSecondary, lr } = input.stateAt(extensionMm);
  const toughness = toughnessAt(input, extensionMm);
  const margin = (factor: number) => {
    const at = { kPrimary: factor * kPrimary, kSecondary, toughness, lr: factor * lr };
    return Math.min(line.height(at.lr) - toughnessRatio(at), line.lrMax - at.lr);
  };
  return reserveOnLoad(margin, lr > 0 ? line.lrMax / lr : toughness / kPrimary);
}
