/**
 * Exponential and logarithm from additions and multiplications alone. The language leaves the last bits of
 * Math.exp and Math.log to the engine that runs it; these give the same bits everywhere.
 */

// ln 2 in two parts, the first with zeros enough at its end that a multiple of it is exact (fdlibm)
const LN2_HIGH = 6.9314718036912381649e-1;
const LN2_LOW = 1.90821492927058770002e-10;
const LN2 = LN2_HIGH + LN2_LOW;

/** Parts into which the table of the exponential divides an octave: 2^8. */
const EXP_BITS = 8;
const EXP_PARTS = 2 ** EXP_BITS;
/** Parts into which the table of the logarithm divides an octave. */
const PARTS = 64;
const PART_HIGH = LN2_HIGH / EXP_PARTS;
const PART_LOW = LN2_LOW / EXP_PARTS;
const PARTS_PER_E = EXP_PARTS / LN2;

// adding and taking it away again rounds to the nearest whole number
const ROUNDER = 1.5 * 2 ** 52;

/** Powers of two from 2^−1022: entry k holds 2^(k − 1022). */
const OCTAVES = octaves();
/** 2^(j/256). */
const FRACTIONS = fractions();
/** Reciprocal of the middle of each part of [1, 2), and its logarithm. */
const RECIPROCALS = Float64Array.from({ length: PARTS }, (_, j) => 1 / middle(j));
const LOGARITHMS = Float64Array.from({ length: PARTS }, (_, j) => seriesLog(middle(j)));

/** The exponential function; beyond ±700 it stays at its value there. */
export function exp(x: number): number {
  const bounded = x > 700 ? 700 : x < -700 ? -700 : x;
  const whole = bounded * PARTS_PER_E + ROUNDER - ROUNDER;
  const r = bounded - whole * PART_HIGH - whole * PART_LOW;
  const k = whole | 0;
  const r2 = r * r;
  const series = 1 + (r + r2 * (0.5 + r * (1 / 6) + r2 * (1 / 24)));
  return (
    (FRACTIONS[k & (EXP_PARTS - 1)] as number) *
    series *
    (OCTAVES[(k >> EXP_BITS) + 1022] as number)
  );
}

/** The exponential of the first numbers of a list, in place. */
export function expEach(values: Float64Array, count: number): void {
  for (let i = 0; i < count; i++) values[i] = exp(values[i] as number);
}

/** Least and greatest argument of `log`. */
export const LOG_LEAST = 1 / 64;
export const LOG_GREATEST = 2 ** 24;

/** The natural logarithm of a number between 1/64 and 2^24; outside the answer means nothing. */
export function log(x: number): number {
  const scaled = x * 64;
  const octave = 31 - Math.clz32(scaled | 0);
  const mantissa = scaled * (OCTAVES[1022 - octave] as number);
  const j = ((mantissa * PARTS) | 0) - PARTS;
  const r = mantissa * (RECIPROCALS[j] as number) - 1;
  const r2 = r * r;
  const series = r - r2 * (0.5 - r * (1 / 3) + r2 * (0.25 - r * 0.2 + r2 * (1 / 6)));
  return (octave - 6) * LN2 + ((LOGARITHMS[j] as number) + series);
}

/** The natural logarithm of the first numbers of a list, each between 1/64 and 2^24, in place. */
export function logEach(values: Float64Array, count: number): void {
  for (let i = 0; i < count; i++) values[i] = log(values[i] as number);
}

/** The natural logarithm of any positive normal number, at the cost of a loop. */
export function logOfAny(x: number): number {
  let octave = 0;
  let rest = x;
  for (; rest < 1; rest *= 2 ** 20) octave -= 20;
  for (; rest >= 2 ** 20; rest /= 2 ** 20) octave += 20;
  return octave * LN2 + log(rest);
}

function octaves(): Float64Array {
  const powers = new Float64Array(2046);
  let power = 2.2250738585072014e-308;
  for (let k = 0; k < powers.length; k++, power *= 2) powers[k] = power;
  return powers;
}

// products of square roots, which every engine rounds alike
function fractions(): Float64Array {
  const values = new Float64Array(EXP_PARTS).fill(1);
  let root = 2;
  for (let bit = EXP_PARTS / 2; bit >= 1; bit /= 2) {
    root = Math.sqrt(root);
    for (let j = 0; j < EXP_PARTS; j++) if (j & bit) values[j] = (values[j] as number) * root;
  }
  return values;
}

function middle(j: number): number {
  return 1 + (j + 0.5) / PARTS;
}

// ln x = 2 artanh((x − 1)/(x + 1)), for 1 to 2 good to the last bit after 17 terms
function seriesLog(x: number): number {
  const z = (x - 1) / (x + 1);
  let sum = 0;
  for (let k = 33; k >= 1; k -= 2) sum = sum * z * z + 1 / k;
  return 2 * z * sum;
}
