import fc from 'fast-check';
import { updateGrowth } from './update-growth';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const finding = (years: number, sizeMm: number) => ({ years, sizeMm, sizingSdMm: 0.5 });
const PRIOR = { mean: 0.25, sd: 0.15 };

function updated(findings: Parameters<typeof updateGrowth>[1]) {
  const answer = updateGrowth(PRIOR, findings);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
}

describe('a growth rate after further findings', () => {
  it('lies between what was believed and what was measured', () => {
    const { rate, measured } = updated([finding(0, 4), finding(3, 5.2)]);
    expect(measured.rateMmPerYear).toBeCloseTo(0.4, 12);
    expect(rate.mean).toBeCloseTo(0.2932384, 6);
  });

  it('is known better with every finding, never worse', () => {
    fc.assert(
      fc.property(fc.array(between(3, 8), { minLength: 3, maxLength: 8 }), (sizes) => {
        const findings = sizes.map((size, i) => finding(2 * i, size));
        const before = updated(findings.slice(0, -1)).rate.sd;
        expect(updated(findings).rate.sd).toBeLessThanOrEqual(before * (1 + 1e-12));
        expect(before).toBeLessThan(PRIOR.sd);
      }),
    );
  });

  it('counts each sizing once: a finding halfway on a line of equal errors adds nothing', () => {
    const two = updated([finding(0, 4), finding(4, 5)]).rate;
    const three = updated([finding(0, 4), finding(2, 4.5), finding(4, 5)]).rate;
    expect(three.sd).toBeCloseTo(two.sd, 12);
    expect(three.mean).toBeCloseTo(two.mean, 12);
  });

  it.each([
    ['findings', PRIOR, []],
    ['findings', PRIOR, [finding(0, 4)]],
    ['findings.1.years', PRIOR, [finding(3, 4), finding(0, 5)]],
    ['prior.sd', { mean: 0.2, sd: 0 }, [finding(0, 4), finding(3, 5)]],
  ])('is refused by name: %s', (input, prior, findings) => {
    const answer = updateGrowth(prior, findings);
    expect(answer.status === 'refused' && answer.refusals[0]?.input).toBe(input);
  });
});
