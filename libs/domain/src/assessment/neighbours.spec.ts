import { assessFlaw } from './assess-flaw';
import type { AssessmentInput } from './assessment-input';
import type { NeighbourInput } from './assessment-input-options';
import type { AssessedFlaw } from './assessment-outcome';
import { given, sampleInput, type Variation } from './testing/sample-input';

const beside = (change: Partial<NeighbourInput> = {}): NeighbourInput => ({
  name: 'F02',
  kind: 'surface',
  heightMm: given(3),
  lengthMm: given(20),
  ligamentMm: null,
  distanceMm: given(26),
  planeOffsetMm: given(0),
  ...change,
});

function withNeighbours(
  neighbours: readonly NeighbourInput[],
  variation: Variation = {},
  rule: string | null = null,
): AssessmentInput {
  const plain = sampleInput({ allowance: 0, lengthAllowance: 0, horizon: 100, ...variation });
  return { ...plain, neighbours, interactionRule: rule };
}

function assessed(input: AssessmentInput): AssessedFlaw {
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

describe('a flaw with neighbours', () => {
  it('is assessed as the flaw that encloses both when they are near', () => {
    // 24 and 20 mm long, middles 23.5 mm apart: a gap of 1.5 mm within half the depth of 4 mm
    const flaw = assessed(withNeighbours([beside({ distanceMm: given(23.5) })]));
    expect(flaw.assessed.heightMm).toBe(4);
    expect(2 * flaw.assessed.cMm).toBeCloseTo(24 / 2 + 23.5 + 20 / 2, 10);
    const step = flaw.sheet.find(({ name }) => name.startsWith('Combined'));
    expect(step?.name).toBe('Combined, side by side: this flaw and F02');
    expect(step?.source).toMatch(/BS 7910:2013/);
  });

  it('is assessed alone when they are far, and says so', () => {
    const far = assessed(withNeighbours([beside({ distanceMm: given(120) })]));
    const alone = assessed(withNeighbours([]));
    expect(far.kr).toBe(alone.kr);
    expect(far.sheet.some(({ name }) => name === 'Neighbours do not interact')).toBe(true);
  });

  it('is judged the same from whichever side the neighbour lies', () => {
    const at = (distance: number) =>
      assessed(withNeighbours([beside({ distanceMm: given(distance) })]));
    expect(at(-23.5).kr).toBeCloseTo(at(23.5).kr, 12);
  });

  it('is taken by the rule that was chosen', () => {
    const neighbours = [beside({ distanceMm: given(30) })];
    const bs = assessed(withNeighbours(neighbours));
    const api = assessed(withNeighbours(neighbours, {}, 'api-579'));
    expect(api.assessed.cMm).toBeGreaterThan(bs.assessed.cMm);
  });

  it('that lie in planes far apart stays alone', () => {
    const other = beside({ distanceMm: given(23.5), planeOffsetMm: given(30) });
    expect(assessed(withNeighbours([other])).assessed.cMm).toBe(12);
  });

  it('embedded below a surface flaw becomes one surface flaw to its lowest point', () => {
    const below = beside({ kind: 'embedded', ligamentMm: given(6), distanceMm: given(0) });
    const flaw = assessed(withNeighbours([below]));
    expect(flaw.assessed.heightMm).toBe(9);
  });

  it('joins them as both grow, later than it is found and with the jump reported', () => {
    const input = withNeighbours([beside({ heightMm: given(4), distanceMm: given(27) })], {
      cycles: 20_000,
      toughness: 150,
    });
    const flaw = assessed(input);
    const [event] = flaw.events;
    expect(event).toMatchObject({ from: 'surface', to: 'surface' });
    expect(event?.rule).toMatch(/joins its neighbour/);
    expect(event?.years).toBeGreaterThan(0);
    expect(event?.lengthAfterMm).toBeGreaterThan(24 + 20);
    expect(flaw.life.firstEventYears).toBeLessThanOrEqual(event?.years ?? 0);
    const alone = assessed(withNeighbours([], { cycles: 20_000, toughness: 150 }));
    expect(flaw.life.years).toBeLessThan(alone.life.years ?? 0);
  });

  it('never lives longer for having one', () => {
    for (const distance of [23, 25, 28, 35, 60]) {
      const own = assessed(
        withNeighbours([beside({ distanceMm: given(distance) })], { cycles: 20_000 }),
      );
      const alone = assessed(withNeighbours([], { cycles: 20_000 }));
      expect(own.life.years).toBeLessThanOrEqual(alone.life.years ?? 0);
      expect(own.reserveOnLoad).toBeLessThanOrEqual(alone.reserveOnLoad + 1e-9);
    }
  });

  it('whose ligament is not known gives no verdict', () => {
    const unknown = beside({ kind: 'embedded', ligamentMm: null });
    expect(assessFlaw(withNeighbours([unknown]))).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'neighbours' }],
    });
  });

  it('of an impossible size is refused by name', () => {
    expect(assessFlaw(withNeighbours([beside({ heightMm: given(-3) })]))).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'neighbours.0.heightMm' }],
    });
  });
});
