import { refused, type Refusal, type Refused } from '../../geometry/refusal';
import { cavityOf, DAMAGE_LIMIT, damagePerYear, peakRange } from './cavity-fatigue';
import type { CavityInput } from './cavity-input';
import { cavityRefusals } from './cavity-rules';
import { cavityBending, cavityHalfExtent, cavityMembrane, cavityPeakFactor } from './cavity-stress';

/** One requirement on the repaired surface, met or not. */
export interface CavityCheck {
  readonly name: string;
  readonly value: number;
  readonly relation: 'at least' | 'at most';
  readonly limit: number;
  readonly unit: string;
  readonly met: boolean;
  readonly source: string;
}

export interface CheckedCavity {
  readonly status: 'checked';
  readonly verdict: 'acceptable' | 'not acceptable';
  /** Why it is not acceptable; empty when it is. */
  readonly reasons: readonly string[];
  readonly remainingWallMm: number;
  readonly peakFactor: number;
  /** Stress at the bottom of the cavity, peak factor on the stress of the remaining wall [MPa]. */
  readonly peakMPa: number;
  readonly remainingMembraneMPa: number;
  readonly remainingBendingMPa: number;
  readonly checks: readonly CavityCheck[];
  /** Null when the load does not vary; a life of null when no range does damage. */
  readonly fatigue: {
    readonly damagePerYear: number;
    readonly lifeYears: number | null;
    readonly basis: string;
  } | null;
}

/**
 * Whether the surface left by grinding a crack away is acceptable: remaining wall, taper, strength of the
 * remaining wall by its reduced section, fatigue of the ground surface by the peak stress range. Upper
 * estimates throughout; that the crack is gone must be shown by inspection. Refuses impossible input and
 * cavities outside the method.
 */
export function checkGroundCavity(input: CavityInput): CheckedCavity | Refused {
  const broken = cavityRefusals(input);
  if (broken.length > 0) return refused(...broken);
  const beyond = beyondElastic(input);
  if (beyond.length > 0) return refused(...beyond);
  const cavity = cavityOf(input);
  const membrane = cavityMembrane(cavity, input.membraneMPa);
  const stress = { membrane: input.membraneMPa, bending: input.bendingMPa };
  const bending = cavityBending(cavity, stress, input.sides === 'free');
  const fatigue = fatigueOf(input);
  const checks = [
    ...shapeChecks(input),
    ...strengthChecks(input, membrane, bending),
    ...(fatigue && input.fatigue ? [damageCheck(fatigue.damagePerYear * input.fatigue.years)] : []),
  ];
  const reasons = checks.filter(({ met }) => !met).map(reason);
  return {
    status: 'checked',
    verdict: reasons.length === 0 ? 'acceptable' : 'not acceptable',
    reasons,
    remainingWallMm: input.thicknessMm - input.depthMm,
    peakFactor: cavityPeakFactor(cavity),
    peakMPa: cavityPeakFactor(cavity) * (membrane + bending),
    remainingMembraneMPa: membrane,
    remainingBendingMPa: bending,
    checks,
    fatigue,
  };
}

const atLeast = (name: string, value: number, limit: number, unit: string, source: string) =>
  ({ name, value, relation: 'at least', limit, unit, met: value >= limit, source }) as const;

const atMost = (name: string, value: number, limit: number, unit: string, source: string) =>
  ({ name, value, relation: 'at most', limit, unit, met: value <= limit, source }) as const;

function shapeChecks(input: CavityInput): readonly CavityCheck[] {
  const taper = cavityHalfExtent(cavityOf(input)) / input.depthMm;
  const wall = input.thicknessMm - input.depthMm;
  return [
    atLeast('Remaining wall', wall, input.requiredThicknessMm, 'mm', 'required wall as given'),
    atLeast('Taper, half extent over depth', taper, input.leastTaper, '', 'common practice'),
  ];
}

const CODE = 'design stress min(yield/1.5, tensile/2.4), EN 13445-3 clause 6 (from memory)';

function strengthChecks(input: CavityInput, membrane: number, bending: number) {
  const design = Math.min(input.yieldMPa / 1.5, input.tensileMPa / 2.4);
  const both = membrane + Math.abs(bending);
  return [
    atMost('Membrane stress in the remaining wall', membrane, design, 'MPa', CODE),
    atMost('Membrane and bending in the remaining wall', both, 1.5 * design, 'MPa', CODE),
  ];
}

const damageCheck = (damage: number) =>
  atMost(
    'Fatigue damage of the ground surface',
    damage,
    DAMAGE_LIMIT,
    '',
    'IIW 2008 (from memory)',
  );

const reason = ({ name, value, relation, limit, unit }: CavityCheck): string =>
  `${name} is ${figure(value, unit)}; it must be ${relation} ${figure(limit, unit)}.`;

const figure = (value: number, unit: string) => `${Number(value.toPrecision(4))} ${unit}`.trim();

function fatigueOf(input: CavityInput): CheckedCavity['fatigue'] {
  if (input.fatigue === null) return null;
  const { surface, blocks } = input.fatigue;
  const damage = damagePerYear(input, surface, blocks);
  return {
    damagePerYear: damage,
    lifeYears: damage > 0 ? DAMAGE_LIMIT / damage : null,
    basis: `Peak stress range at the bottom of the cavity; class ${surface.rangeMPa} MPa at 2 million cycles, slope ${surface.slope} to 10 million cycles and 5 beyond; ${surface.source}.`,
  };
}

/** The curves hold while the material shakes down: a peak range of at most twice yield. */
function beyondElastic(input: CavityInput): readonly Refusal[] {
  return (input.fatigue?.blocks ?? []).flatMap((block, i) => {
    const range = peakRange(input, block);
    if (range <= 2 * input.yieldMPa) return [];
    return {
      input: `cavity.fatigue.blocks.${i}.membraneRangeMPa`,
      limit: `peak range at most twice yield, ${figure(2 * input.yieldMPa, 'MPa')}`,
      value: range,
      message: `The peak range at the cavity is ${figure(range, 'MPa')}: the surface yields in every cycle.`,
      instead: 'Grind the cavity flatter, or have it assessed by strain-based fatigue.',
    };
  });
}
