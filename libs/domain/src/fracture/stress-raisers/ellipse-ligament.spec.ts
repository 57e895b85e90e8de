import fc from 'fast-check';
import { ellipseLigament, type EllipseInput, type EllipseLigament } from './ellipse-ligament';
import { holeLigament } from './hole-ligament';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const ellipse = (more: Partial<EllipseInput> = {}): EllipseInput => ({
  halfAxisAcrossMm: 20,
  halfAxisAlongMm: 10,
  stressMPa: 100,
  ratio: 0.5,
  pressureMPa: 0,
  ...more,
});
const found = (input: EllipseInput, length: number): EllipseLigament => {
  const answer = ellipseLigament(input, length);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};

describe('the ligament ahead of an ellipse', () => {
  it('is that of the hole when the axes are equal', () => {
    fc.assert(
      fc.property(between(-1, 1), between(1, 40), between(0, 20), (ratio, length, pressureMPa) => {
        const hole = holeLigament({ radiusMm: 20, stressMPa: 100, ratio, pressureMPa }, length);
        const same = ellipse({ halfAxisAlongMm: 20, ratio, pressureMPa });
        const answer = found(same, length);
        if (hole.status === 'refused') throw new Error('refused');
        expect(answer.membrane).toBeCloseTo(hole.membrane, 8);
        expect(answer.bending).toBeCloseTo(hole.bending, 8);
        expect(answer.peakMPa).toBeCloseTo(hole.peakMPa, 8);
        answer.coefficients.forEach((c, n) => expect(c).toBeCloseTo(hole.coefficients[n] ?? 0, 6));
        if (pressureMPa === 0) expect(answer.decayMm).toBeCloseTo(hole.decayMm, 8);
      }),
    );
  });

  it('has its excess down to a tenth at the decay length', () => {
    fc.assert(
      fc.property(between(1, 10), between(-1, 1), (slenderness, ratio) => {
        const answer = found(ellipse({ halfAxisAlongMm: 20 / slenderness, ratio }), 1);
        const left = answer.stressAt(answer.decayMm ?? Number.NaN) - 100;
        expect(left / (answer.peakMPa - 100)).toBeCloseTo(0.1, 8);
      }),
    );
  });

  it('peaks by 1 + 2A/B − λ and decays faster the sharper it is', () => {
    const [blunt, sharp] = [5, 2].map((b) => found(ellipse({ halfAxisAlongMm: b }), 1));
    expect(blunt?.peakMPa).toBeCloseTo(850, 8);
    expect(sharp?.peakMPa).toBeCloseTo(2050, 8);
    expect(sharp?.peakFactor).toBeCloseTo(20.5, 12);
    expect(sharp?.decayMm).toBeLessThan(blunt?.decayMm ?? 0);
    expect(sharp?.rootRadiusMm).toBeCloseTo(0.2, 12);
  });

  it('has no decay length where the stress hardly peaks at the edge, or not at all', () => {
    expect(found(ellipse({ halfAxisAlongMm: 40, ratio: 0.99 }), 5).decayMm).toBeNull();
    const answer = found(ellipse({ stressMPa: 0 }), 5);
    expect(answer.decayMm).toBeNull();
    expect(answer.membrane).toBeCloseTo(0, 12);
  });

  it.each([
    [ellipse({ halfAxisAcrossMm: 0 }), 1, 'ellipse.halfAxisAcrossMm'],
    [ellipse({ halfAxisAlongMm: Number.NaN }), 1, 'ellipse.halfAxisAlongMm'],
    [ellipse({ halfAxisAlongMm: 0.5 }), 0.1, 'ellipse.halfAxisAlongMm'],
    [ellipse({ stressMPa: 1e5 }), 1, 'ellipse.stressMPa'],
    [ellipse({ ratio: 3 }), 1, 'ellipse.ratio'],
    [ellipse({ pressureMPa: -1 }), 1, 'ellipse.pressureMPa'],
    [ellipse(), 500, 'lengthMm'],
    [ellipse(), Number.NaN, 'lengthMm'],
  ])('refuses %j over %d by %s', (input, length, path) => {
    const answer = ellipseLigament(input, length);
    expect(answer.status === 'refused' && answer.refusals.map((each) => each.input)).toContain(
      path,
    );
  });
});
