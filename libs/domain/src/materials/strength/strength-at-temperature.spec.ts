import fc from 'fast-check';
import {
  STRENGTH_TEMPERATURE_C,
  tensileBelowRoom,
  yieldBelowRoom,
} from './strength-at-temperature';

const cold = fc.double({ ...STRENGTH_TEMPERATURE_C, noNaN: true });
const strengths = fc.double({ min: 150, max: 900, noNaN: true });

describe('strength of steel in the cold', () => {
  it('is never below that at room temperature, and rises as it gets colder', () => {
    fc.assert(
      fc.property(strengths, cold, fc.double({ min: 0.1, max: 50, noNaN: true }), (s, t, less) => {
        expect(yieldBelowRoom(s, t)).toBeGreaterThan(s);
        expect(tensileBelowRoom(s, t)).toBeGreaterThan(s);
        expect(yieldBelowRoom(s, t - less)).toBeGreaterThan(yieldBelowRoom(s, t));
        expect(tensileBelowRoom(s, t - less)).toBeGreaterThan(tensileBelowRoom(s, t));
      }),
    );
  });

  it('is within 1 MPa of room temperature at 20 °C', () => {
    expect(yieldBelowRoom(350, 20) - 350).toBeCloseTo(0.75, 2);
    expect(tensileBelowRoom(500, 20) / 500).toBeCloseTo(1, 2);
  });
});
