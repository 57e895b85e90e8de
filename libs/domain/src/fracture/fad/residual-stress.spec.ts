import fc from 'fast-check';
import {
  asWeldedResidual,
  PROOF_TEST_CONDITIONS,
  proofTestedResidual,
  relaxedResidual,
  residualYield,
} from './residual-stress';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const STRENGTHS = { weldMPa: 420, parentMPa: 350, flawIn: 'weld' } as const;

describe('residual stress as welded', () => {
  it('is along the weld the yield of the metal that holds the flaw', () => {
    expect(asWeldedResidual('parallel', STRENGTHS)).toBe(420);
    expect(asWeldedResidual('parallel', { ...STRENGTHS, flawIn: 'parent' })).toBe(350);
  });

  it('is across the weld the lesser yield, wherever the flaw lies', () => {
    expect(asWeldedResidual('transverse', STRENGTHS)).toBe(350);
    expect(asWeldedResidual('transverse', { ...STRENGTHS, weldMPa: 300, flawIn: 'parent' })).toBe(
      300,
    );
  });

  it('takes a specified minimum yield as lower than the real one', () => {
    expect(residualYield(250) - 250).toBe(69);
  });
});

describe('residual stress after a proof test', () => {
  const cases = fc.record({
    proofReference: between(0, 800),
    serviceReference: between(0, 800),
    yieldMPa: between(200, 600),
    tensileMPa: between(600, 900),
  });

  it('is that of the largest load so far: never more than service alone leaves', () => {
    fc.assert(
      fc.property(cases, (test) => {
        const residual = proofTestedResidual(test);
        const { serviceReference, yieldMPa, tensileMPa } = test;
        expect(residual).toBeLessThanOrEqual(
          relaxedResidual(serviceReference, yieldMPa, tensileMPa),
        );
        expect(residual).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('is what service leaves without a test, and needs a load beyond 0.4 of flow to be relieved', () => {
    const none = { proofReference: 0, serviceReference: 100, yieldMPa: 350, tensileMPa: 500 };
    expect(proofTestedResidual(none)).toBe(350);
    expect(proofTestedResidual({ ...none, proofReference: 0.4 * 425 })).toBeCloseTo(350, 9);
    expect(proofTestedResidual({ ...none, proofReference: 300 })).toBeLessThan(350);
  });

  it('says under which conditions the test counts', () => {
    expect(PROOF_TEST_CONDITIONS).toHaveLength(4);
  });
});
