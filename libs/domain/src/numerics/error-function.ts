import { polynomialRatio } from './polynomial-ratio';

// Cody 1969, rational Chebyshev approximations for the error function; highest power first
const CENTRE = {
  numerator: [
    1.85777706184603153e-1, 3.1611237438705656, 1.13864154151050156e2, 3.77485237685302021e2,
    3.20937758913846947e3,
  ],
  denominator: [
    1, 2.36012909523441209e1, 2.44024637934444173e2, 1.28261652607737228e3, 2.84423683343917062e3,
  ],
};
const MIDDLE = {
  numerator: [
    2.15311535474403846e-8, 5.64188496988670089e-1, 8.88314979438837594, 6.61191906371416295e1,
    2.98635138197400131e2, 8.8195222124176909e2, 1.71204761263407058e3, 2.05107837782607147e3,
    1.23033935479799725e3,
  ],
  denominator: [
    1, 1.57449261107098347e1, 1.17693950891312499e2, 5.37181101862009858e2, 1.62138957456669019e3,
    3.29079923573345963e3, 4.36261909014324716e3, 3.43936767414372164e3, 1.23033935480374942e3,
  ],
};
const TAIL = {
  numerator: [
    1.63153871373020978e-2, 3.05326634961232344e-1, 3.60344899949804439e-1, 1.25781726111229246e-1,
    1.60837851487422766e-2, 6.58749161529837803e-4,
  ],
  denominator: [
    1, 2.56852019228982242, 1.87295284992346047, 5.27905102951428412e-1, 6.05183413124413191e-2,
    2.33520497626869185e-3,
  ],
};
const ONE_OVER_ROOT_PI = 0.56418958354775628695;
const CENTRE_END = 0.46875;
const MIDDLE_END = 4;
const UNDERFLOW = 27;

/**
 * Error function erf(x) = (2/√π) ∫₀ˣ exp(−t²) dt.
 * @param x argument [-]
 * @returns erf(x), −1 to 1 [-]
 * @validity any real x
 * @source Cody, Mathematics of Computation 23 (1969) 631
 * @example erf(1) // 0.84270079295
 */
export function erf(x: number): number {
  const y = Math.abs(x);
  if (y <= CENTRE_END) return x * centre(y);
  return Math.sign(x) * (1 - upper(y));
}

/**
 * Complementary error function erfc(x) = 1 − erf(x), to full relative accuracy in the upper tail.
 * @param x argument [-]
 * @returns erfc(x), 0 to 2 [-]
 * @validity any real x; 0 by underflow beyond 26.5
 * @source Cody, Mathematics of Computation 23 (1969) 631
 * @example erfc(3) * 1e5 // 2.2090496999
 */
export function erfc(x: number): number {
  const y = Math.abs(x);
  if (y <= CENTRE_END) return 1 - x * centre(y);
  return x > 0 ? upper(y) : 2 - upper(y);
}

const centre = (y: number) => polynomialRatio(y * y, CENTRE.numerator, CENTRE.denominator);

function upper(y: number): number {
  if (y > UNDERFLOW) return 0;
  if (y <= MIDDLE_END) {
    return squaredExponential(y) * polynomialRatio(y, MIDDLE.numerator, MIDDLE.denominator);
  }
  const z = 1 / (y * y);
  const correction = z * polynomialRatio(z, TAIL.numerator, TAIL.denominator);
  return (squaredExponential(y) * (ONE_OVER_ROOT_PI - correction)) / y;
}

/** exp(−y²) with the square split, so that its rounding does not spoil the tail. */
function squaredExponential(y: number): number {
  const coarse = Math.trunc(y * 16) / 16;
  return Math.exp(-coarse * coarse) * Math.exp(-(y - coarse) * (y + coarse));
}
