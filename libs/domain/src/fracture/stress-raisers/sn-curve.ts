/** A fatigue class: stress range endured for two million cycles, and how the curve runs. */
export interface SnClass {
  readonly key: string;
  readonly title: string;
  /** Range at 2·10⁶ cycles [MPa]. */
  readonly rangeMPa: number;
  /** Slope of the curve above the knee, m. */
  readonly slope: number;
  readonly source: string;
}

const IIW = 'IIW Recommendations for Fatigue Design of Welded Joints and Components, 2008';

/** Classes of a ground surface; both curves have slope 3, with the stress range at the ground surface itself. */
export const GROUND_CLASSES = [
  {
    key: 'ground-weld',
    title: 'Weld or heat-affected zone, ground flush, found free of cracks',
    rangeMPa: 112,
    slope: 3,
    source: `${IIW}, butt weld ground flush (from memory)`,
  },
  {
    key: 'ground-plate',
    title: 'Plate away from welds, ground smooth, found free of cracks',
    rangeMPa: 125,
    slope: 3,
    source: `${IIW}, thermally cut edge with the hard zone dressed, lower class (from memory)`,
  },
] as const satisfies readonly SnClass[];

/** Cycles at the class's own range. */
const ANCHOR = 2e6;
/** Cycles at which the curve of a load that varies turns to its flatter slope. */
export const KNEE_CYCLES = 1e7;
const FLAT_SLOPE = 5;

/**
 * Cycles endured at a stress range: 2·10⁶ (FAT/Δσ)^m down to the knee at 10⁷ cycles, the slope 5 below it,
 * as for a load that varies; there is no range without damage.
 * @param range stress range at the surface, Δσ [MPa]
 * @param curve fatigue class [MPa]
 * @returns cycles to failure at the class's survival probability [cycles]
 * @validity Δσ > 0; steel in air, below its creep range; membrane and bending alike
 * @source IIW recommendations 2008, section 3.2 (from memory)
 * @example cyclesEndured(100, { key: '', title: '', rangeMPa: 100, slope: 3, source: '' }) // 2000000
 */
export function cyclesEndured(range: number, { rangeMPa, slope }: SnClass): number {
  const knee = kneeRange({ rangeMPa, slope });
  return range >= knee
    ? ANCHOR * (rangeMPa / range) ** slope
    : KNEE_CYCLES * (knee / range) ** FLAT_SLOPE;
}

/**
 * Stress range at the knee of the curve.
 * @param curve fatigue class [MPa]
 * @returns range at 10⁷ cycles [MPa]
 * @validity slope above 0
 * @source IIW recommendations 2008, section 3.2 (from memory)
 * @example kneeRange({ rangeMPa: 100, slope: 3 }) // 58.4803548
 */
export const kneeRange = ({ rangeMPa, slope }: Pick<SnClass, 'rangeMPa' | 'slope'>): number =>
  rangeMPa * (ANCHOR / KNEE_CYCLES) ** (1 / slope);

/**
 * Share of the class left in a thick wall, (25/t)^0.1 above 25 mm.
 * @param thickness wall, t [mm]
 * @returns factor on the class's range [-]
 * @validity ground flush surface
 * @source IIW recommendations 2008, section 3.5, exponent for ground welds and base material (from memory)
 * @example thicknessFactor(50) // 0.9330329915
 */
export const thicknessFactor = (thickness: number): number => (25 / Math.max(thickness, 25)) ** 0.1;
