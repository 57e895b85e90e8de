/** Millimetres in one unit of length; exact by definition (1 in = 25.4 mm). */
export const MM_PER = { mm: 1, cm: 10, m: 1000, in: 25.4, mil: 0.0254 } as const;
export type LengthUnit = keyof typeof MM_PER;

// 1 lbf = 0.45359237 kg · 9.80665 m/s², exact by definition; 1 psi = 1 lbf/in²
const MPA_PER_PSI = (0.45359237 * 9.80665) / 25.4 ** 2;

/** Megapascals in one unit of stress or pressure; exact by definition. */
export const MPA_PER = {
  MPa: 1,
  'N/mm²': 1,
  bar: 0.1,
  psi: MPA_PER_PSI,
  ksi: 1000 * MPA_PER_PSI,
} as const;
export type StressUnit = keyof typeof MPA_PER;

/** MPa·√mm in one unit of stress intensity: stress factor times the root of the length factor. */
export const MPA_SQRT_MM_PER = {
  'MPa·√mm': 1,
  'MPa·√m': Math.sqrt(1000),
  'ksi·√in': 1000 * MPA_PER_PSI * Math.sqrt(25.4),
} as const;
export type StressIntensityUnit = keyof typeof MPA_SQRT_MM_PER;
