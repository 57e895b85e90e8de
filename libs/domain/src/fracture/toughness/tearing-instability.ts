import {
  outOfBounds,
  refused,
  type NumberRule,
  type Refusal,
  type Refused,
} from '../../geometry/refusal';
import { findMaximum } from '../../numerics/find-maximum';
import { tearingResistance, type TearingCurve } from './tearing-resistance';
import { rule } from './toughness-rules';

/** How far a driving J may rise before tearing runs away, and how far the crack has torn by then. */
export interface TearingInstability {
  readonly status: 'found';
  /** Factor on the driving J at which the crack becomes unstable; below 1 it already is. */
  readonly factorOnJ: number;
  readonly extensionMm: number;
  readonly jNPerMm: number;
  /** `tangent`: the curves touch; `valid extension`: still stable where the tests end, which then decides. */
  readonly end: 'tangent' | 'valid extension';
}

const SMALLEST_SHARE = 1e-6;
const AT_END = 1 - 1e-6;

/**
 * Instability of ductile tearing under held load: the driving J, given as a function of the extension at the
 * present load, is scaled until it touches the resistance. That is where JR/J is greatest.
 */
export function tearingInstability(
  curve: TearingCurve,
  drivingJ: (extensionMm: number) => number,
): TearingInstability | Refused {
  const refusals = outOfBounds(rulesOf(curve, drivingJ));
  if (refusals.length > 0) return refused(...refusals);
  const { validToMm } = curve;
  // in the logarithm, for the curve is steep at its start
  const ratio = (u: number): number => {
    const extension = Math.exp(u);
    return tearingResistance(curve, extension) / drivingJ(extension);
  };
  const top = findMaximum(ratio, Math.log(SMALLEST_SHARE * validToMm), Math.log(validToMm));
  if (!Number.isFinite(top.value)) return refused(NO_DRIVING_J);
  const extensionMm = Math.min(Math.exp(top.x), validToMm);
  return {
    status: 'found',
    factorOnJ: top.value,
    extensionMm,
    jNPerMm: tearingResistance(curve, extensionMm),
    end: extensionMm < AT_END * validToMm ? 'tangent' : 'valid extension',
  };
}

const NO_DRIVING_J: Refusal = {
  input: 'drivingJ',
  limit: 'a number above 0 at every extension',
  value: null,
  message: 'The driving J is not a number above 0 at every extension.',
  instead: 'Tearing needs a driving J above 0 over the whole extension.',
};

const rulesOf = (
  { coefficient, exponent, validToMm }: TearingCurve,
  drivingJ: (extensionMm: number) => number,
): readonly NumberRule[] => [
  rule('tearingCoefficient', 'coefficient', coefficient),
  rule('tearingExponent', 'exponent', exponent),
  { ...rule('extension', 'validToMm', validToMm), above: true },
  ...[0, validToMm].map((extension) => ({
    input: 'drivingJ',
    name: `Driving J after ${extension} mm`,
    unit: 'N/mm',
    value: drivingJ(extension),
    min: 0,
    max: 1e6,
    above: true,
    instead: NO_DRIVING_J.instead,
  })),
];
