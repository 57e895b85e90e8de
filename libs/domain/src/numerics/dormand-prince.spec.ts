import { dormandPrince } from './dormand-prince';

function integrate(steps: number, end: number): Float64Array {
  // y' = y, z' = -z: known to every digit
  const stepper = dormandPrince(2, (y, slope) => {
    slope[0] = y[0] ?? 0;
    slope[1] = -(y[1] ?? 0);
  });
  const y = Float64Array.of(1, 1);
  for (let i = 0; i < steps; i++) {
    stepper.step(y, end / steps);
    y.set(stepper.next);
  }
  return y;
}

describe('dormandPrince', () => {
  it('follows an exponential', () => {
    const [up, down] = integrate(20, 1);
    expect(up).toBeCloseTo(Math.E, 9);
    expect(down).toBeCloseTo(1 / Math.E, 9);
  });

  it('is of fifth order: half the step, a 32nd of the error', () => {
    const error = (steps: number) => Math.abs((integrate(steps, 2)[0] ?? 0) - Math.exp(2));
    expect(Math.log2(error(8) / error(16))).toBeGreaterThan(4.5);
  });

  it('is exact for a polynomial of fourth degree', () => {
    const stepper = dormandPrince(2, (y, slope) => {
      slope[0] = 1;
      slope[1] = 5 * (y[0] ?? 0) ** 4;
    });
    stepper.step(Float64Array.of(0, 0), 2);
    expect(stepper.next[1]).toBeCloseTo(32, 10);
  });

  it('estimates an error of the size it makes', () => {
    const stepper = dormandPrince(1, (y, slope) => {
      slope[0] = y[0] ?? 0;
    });
    stepper.step(Float64Array.of(1), 0.5);
    const made = Math.abs((stepper.next[0] ?? 0) - Math.exp(0.5));
    expect(Math.abs(stepper.error[0] ?? 0)).toBeGreaterThan(made);
    expect(Math.abs(stepper.error[0] ?? 0)).toBeLessThan(1e-4);
  });

  it('leaves the state it starts from alone', () => {
    const stepper = dormandPrince(1, (_, slope) => {
      slope[0] = 3;
    });
    const y = Float64Array.of(7);
    stepper.step(y, 1);
    expect(y[0]).toBe(7);
    expect(stepper.next[0]).toBeCloseTo(10, 12);
  });

  it('takes six evaluations where the slope at the start is known, for the same step', () => {
    let count = 0;
    const stepper = dormandPrince(1, (y, slope) => {
      count += 1;
      slope[0] = (y[0] ?? 0) ** 2;
    });
    const y = Float64Array.of(0.5);
    stepper.step(y, 0.3);
    const plain = stepper.next[0];
    expect(count).toBe(7);
    stepper.start(y);
    stepper.step(y, 0.3, true);
    expect(stepper.next[0]).toBe(plain);
    expect(count).toBe(14);
    y.set(stepper.next);
    stepper.keep();
    stepper.step(y, 0.3, true);
    expect(count).toBe(20);
    // y = 1/(2 − s) at s = 0.6
    expect(stepper.next[0]).toBeCloseTo(1 / 1.4, 5);
  });

  it('draws a curve through the step, of fourth order, without an evaluation', () => {
    const stepper = dormandPrince(1, (y, slope) => {
      slope[0] = y[0] ?? 0;
    });
    const into = new Float64Array(1);
    const worst = (h: number) => {
      stepper.step(Float64Array.of(1), h);
      return Math.max(
        ...[0.1, 0.3, 0.5, 0.7, 0.9].map((share) => {
          stepper.between(Float64Array.of(1), h, share, into);
          return Math.abs((into[0] ?? 0) - Math.exp(share * h));
        }),
      );
    };
    expect(worst(0.5)).toBeLessThan(1e-5);
    expect(Math.log2(worst(0.4) / worst(0.2))).toBeGreaterThan(4.5);
    stepper.step(Float64Array.of(1), 0.5);
    stepper.between(Float64Array.of(1), 0.5, 1, into);
    expect(into[0]).toBeCloseTo(stepper.next[0] ?? 0, 15);
    stepper.between(Float64Array.of(1), 0.5, 0, into);
    expect(into[0]).toBe(1);
  });
});
