/** A complex number; mutable so that hot paths can write into one instead of making one. */
export interface Complex {
  re: number;
  im: number;
}

/** Zero, to be written into. */
export const complex = (re = 0, im = 0): Complex => ({ re, im });

/** Writes a b into `into`, which may be a or b. */
export function multiply(a: Complex, b: Complex, into: Complex): Complex {
  const re = a.re * b.re - a.im * b.im;
  into.im = a.re * b.im + a.im * b.re;
  into.re = re;
  return into;
}

/** Writes 1/a into `into`, which may be a; a must not be zero. */
export function reciprocal(a: Complex, into: Complex): Complex {
  const square = a.re * a.re + a.im * a.im;
  into.re = a.re / square;
  into.im = -a.im / square;
  return into;
}

/** Writes the root of a whose real part is not negative into `into`, which may be a. */
export function squareRoot({ re, im }: Complex, into: Complex): Complex {
  const modulus = Math.sqrt(re * re + im * im);
  // the smaller part from the larger: no digits are lost near the axes
  if (re > 0) {
    into.re = Math.sqrt((modulus + re) / 2);
    into.im = im / (2 * into.re);
  } else {
    const size = Math.sqrt((modulus - re) / 2);
    into.re = size > 0 ? Math.abs(im) / (2 * size) : 0;
    into.im = im < 0 ? -size : size;
  }
  return into;
}
