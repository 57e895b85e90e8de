import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { mpa, mpaSqrtMm } from '../../units/quantity';
import { leastElasticSize, plasticExtent, plasticRadius } from './plastic-zone';

/** A crack, its wall and its stress intensity, to ask whether K alone may judge it. */
export interface ElasticUseInput {
  /** K [MPa·√mm]. */
  readonly intensity: number;
  readonly yieldMPa: number;
  /** Depth of a surface crack, half height of an embedded one, half length of a through crack. */
  readonly crackMm: number;
  /** Wall left ahead of the crack. */
  readonly ligamentMm: number;
  readonly thicknessMm: number;
}

/** One size against what linear elasticity asks of it [mm]. */
export interface ElasticUseCheck {
  readonly name: 'crack' | 'ligament' | 'thickness' | 'zone in the crack' | 'zone in the ligament';
  readonly text: string;
  readonly haveMm: number;
  readonly needMm: number;
  readonly met: boolean;
  readonly source: string;
}

export interface ElasticUse {
  readonly status: 'checked';
  /** `plane strain`: every size is enough; `plane stress`: only the thickness is not; `not alone`: crack or ligament is not. */
  readonly verdict: 'plane strain' | 'plane stress' | 'not alone';
  readonly message: string;
  readonly plasticRadiusMm: { readonly planeStress: number; readonly planeStrain: number };
  readonly checks: readonly ElasticUseCheck[];
}

const E399 = 'ASTM E399, size for small-scale yielding';
const TENTH = 'common practice: zone at most a tenth of the size it lies in';

/**
 * Whether linear elasticity alone may judge a crack: crack, ligament and thickness against 2.5 (K/σy)²,
 * and the extent of the plastic zone against crack and ligament. Refuses impossible numbers.
 */
export function checkElasticUse(input: ElasticUseInput): ElasticUse | Refused {
  const broken = outOfBounds(RULES.map((rule) => ({ ...rule, value: input[rule.key] })));
  if (broken.length > 0) return refused(...broken);
  const [k, sy] = [mpaSqrtMm(input.intensity), mpa(input.yieldMPa)];
  const least = leastElasticSize(k, sy);
  const thick = input.thicknessMm >= least;
  const zone = 10 * plasticExtent(k, sy, thick ? 'plane strain' : 'plane stress');
  const checks = [
    check('crack', input.crackMm, least, E399),
    check('ligament', input.ligamentMm, least, E399),
    check('thickness', input.thicknessMm, least, E399),
    check('zone in the crack', input.crackMm, zone, TENTH),
    check('zone in the ligament', input.ligamentMm, zone, TENTH),
  ];
  const contained = checks.every(({ name, met }) => met || name === 'thickness');
  const verdict = contained ? (thick ? 'plane strain' : 'plane stress') : 'not alone';
  return {
    status: 'checked',
    verdict,
    message: MESSAGES[verdict](least, input),
    plasticRadiusMm: {
      planeStress: plasticRadius(k, sy, 'plane stress'),
      planeStrain: plasticRadius(k, sy, 'plane strain'),
    },
    checks,
  };
}

const figure = (value: number) => `${Number(value.toPrecision(3))} mm`;

const MESSAGES = {
  'plane strain': () =>
    'The plastic zone is small: the stress intensity alone may judge this crack.',
  'plane stress': (least, { thicknessMm }) =>
    `The plastic zone is small against crack and ligament, but the wall of ${figure(thicknessMm)} is below ${figure(least)}: plane stress, toughness of that thickness.`,
  'not alone': (least, { crackMm, ligamentMm }) =>
    `2.5 (K/σy)² is ${figure(least)}; the crack has ${figure(crackMm)} and the ligament ${figure(ligamentMm)}: the stress intensity alone is not valid, the failure assessment diagram is used.`,
} as const satisfies Record<
  ElasticUse['verdict'],
  (least: number, input: ElasticUseInput) => string
>;

const check = (
  name: ElasticUseCheck['name'],
  haveMm: number,
  needMm: number,
  source: string,
): ElasticUseCheck => ({
  name,
  text: `${name}: ${figure(haveMm)} against ${figure(needMm)}`,
  haveMm,
  needMm,
  met: haveMm >= needMm,
  source,
});

const SIZE = { unit: 'mm', min: 0, max: 1e5, above: true, instead: 'Give it in millimetres.' };

const RULES = [
  {
    key: 'intensity',
    input: 'intensity',
    name: 'Stress intensity',
    unit: 'MPa·√mm',
    min: 0,
    max: 5e4,
    instead: 'Give it in MPa·√mm: 31.6 times the value in MPa·√m.',
  },
  {
    key: 'yieldMPa',
    input: 'material.yieldMPa',
    name: 'Yield strength',
    unit: 'MPa',
    min: 50,
    max: 2000,
    instead: 'Give it in MPa (N/mm²).',
  },
  { ...SIZE, key: 'crackMm', input: 'crack.sizeMm', name: 'Crack size' },
  { ...SIZE, key: 'ligamentMm', input: 'crack.ligamentMm', name: 'Ligament', above: false },
  { ...SIZE, key: 'thicknessMm', input: 'wall.thicknessMm', name: 'Wall thickness' },
] as const satisfies readonly (Omit<NumberRule, 'value'> & { key: keyof ElasticUseInput })[];
