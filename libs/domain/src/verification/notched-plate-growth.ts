import { cycleByCycle } from '../growth/closed-form/cycle-by-cycle';
import { integralPerCycle, lifeIntegral } from '../growth/closed-form/power-life';
import { sizeAtRange } from '../growth/closed-form/stage-life';
import { convertParisCoefficient } from '../units/convert-paris';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';

/** A thin plate under tension with a crack at each of two notches, or one in the middle [N, mm]. */
export interface PlateCase {
  readonly kind: 'edge' | 'centre';
  readonly forceN: number;
  readonly width: number;
  readonly thickness: number;
  /** Depth of each notch; 0 for none. */
  readonly notch: number;
  readonly notchFactor: number;
  readonly start: number;
  /** Toughness [MPa·√m]; coefficient in m/cycle with MPa·√m. */
  readonly toughness: number;
  readonly coefficient: number;
  readonly exponent: number;
}

/** Cycles of the two stretches, inside the field of the notch and beyond, and the size at the end. */
export interface PlateLife {
  readonly nearNotch: number;
  readonly beyond: number;
  readonly critical: number;
  readonly transition: number;
}

const stageOf = ({ coefficient, exponent }: PlateCase) => ({
  coefficient: convertParisCoefficient(coefficient, exponent, {
    from: { growth: 'm', range: 'MPa·√m' },
  }),
  exponent,
});
const toughnessOf = ({ toughness }: PlateCase) => toughness * MPA_SQRT_MM_PER['MPa·√m'];

/** Length over which the notch still raises the stress at the tip. */
const notchReach = ({ notch, notchFactor }: PlateCase, shape: number) =>
  notch / ((1.12 * notchFactor) ** 2 / shape ** 2 - 1);

/** The source's simple way: shape factor and net stress kept as they are at the start. */
export function simplePlateLife(plate: PlateCase): PlateLife {
  const shape = plate.kind === 'edge' ? 1.12 : 1;
  const { notch, start, exponent } = plate;
  const drive = (shape * plate.forceN) / (plate.thickness * (plate.width - 2 * notch));
  const perCycle = integralPerCycle(stageOf(plate), drive);
  const cycles = (from: number, to: number) => lifeIntegral(exponent, from, to) / perCycle;
  const critical = sizeAtRange(toughnessOf(plate), drive);
  const transition = notchReach(plate, shape);
  const near = transition > start;
  return {
    nearNotch: near ? cycles(start, transition) : 0,
    beyond: cycles(near ? transition + notch : start, critical + notch),
    critical,
    transition,
  };
}

/** Shape factor of the source by size: edge polynomial, or secant of a centre crack. */
const shapeAt = ({ kind, width }: PlateCase, a: number): number => {
  const share = a / width;
  return kind === 'centre'
    ? Math.cos(Math.PI * share) ** -0.5
    : 1.12 + share * (-0.231 + share * (10.55 + share * (-21.72 + share * 30.39)));
};

/** The source's long way: shape factor, net stress and critical size anew in every cycle. */
export function steppedPlateLife(plate: PlateCase): PlateLife {
  const { notch, start, width, thickness, forceN } = plate;
  const { coefficient, exponent } = stageOf(plate);
  const transition = notchReach(plate, shapeAt(plate, start + notch));
  let critical = Infinity;
  const perCycle = (a: number) => {
    const drive = (shapeAt(plate, a) * forceN) / (thickness * (width - 2 * notch - a));
    critical = sizeAtRange(toughnessOf(plate), drive);
    const size = a < transition ? a : a + notch;
    return coefficient * (drive * Math.sqrt(Math.PI * size)) ** exponent;
  };
  const all = cycleByCycle(start, perCycle, (a) => a > critical).cycles;
  const atEnd = critical;
  // the cycle that passes the transition counts to the second stretch
  const near =
    transition > start ? cycleByCycle(start, perCycle, (a) => a > transition).cycles - 1 : 0;
  return { nearNotch: near, beyond: all - near, critical: atEnd, transition };
}
