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
});
