import { assess } from '../testing/assess';
import { sampleInput, type Variation } from '../testing/sample-input';
import { locusOfFlaw } from './locus-of-flaw';
import { whatItTakes } from './what-it-takes';

const CASE: Variation = { membrane: 200, toughness: 40 };

function locus(variation: Variation = CASE) {
  const found = locusOfFlaw(sampleInput(variation));
  if (found.status === 'refused') throw new Error(JSON.stringify(found.refusals));
  return found;
}

describe('the limiting locus of an assessed flaw', () => {
  it('passes through the limiting height of the assessment at the assessed length', () => {
    const { points, assessed } = locus();
    const above = points.findIndex(({ lengthMm }) => lengthMm > assessed.lengthMm);
    const [low, high] = [points[above - 1], points[above]];
    const limiting = assess(CASE).limitingHeightMm ?? 0;
    expect(limiting).toBeLessThanOrEqual(low?.heightMm ?? 0);
    expect(limiting).toBeGreaterThanOrEqual(high?.heightMm ?? Infinity);
  });

  it('allows less height the longer the flaw', () => {
    const onLine = locus().points.filter(({ endedBy }) => endedBy === 'line');
    expect(onLine.length).toBeGreaterThan(5);
    for (const [i, { heightMm }] of onLine.slice(1).entries()) {
      expect(heightMm ?? 0).toBeLessThanOrEqual((onLine[i]?.heightMm ?? 0) + 1e-9);
    }
  });

  it('marks measured and assessed size apart by the allowance', () => {
    const { measured, assessed } = locus();
    expect(assessed.heightMm - measured.heightMm).toBeCloseTo(1, 12);
    expect(assessed.lengthMm - measured.lengthMm).toBeCloseTo(2, 12);
  });

  it('holds full heights of an embedded flaw, which ends at its ligament', () => {
    const { points } = locus({ kind: 'embedded', height: 4, ligament: 10, membrane: 60 });
    for (const { heightMm } of points) expect(heightMm ?? 0).toBeLessThan(25);
    expect(points.some(({ heightMm }) => (heightMm ?? 0) > 8)).toBe(true);
  });

  it('answers a case without verdict with its refusal', () => {
    expect(locusOfFlaw(sampleInput({ height: 30 })).status).toBe('refused');
  });
});

describe('what the flaw could bear and what it needs', () => {
  it('needs the toughness that the reserve on toughness leaves', () => {
    const takes = whatItTakes(sampleInput(CASE));
    const { reserveOnToughness } = assess(CASE);
    if (takes.status === 'refused' || takes.leastToughness.status !== 'found') {
      throw new Error('no boundary');
    }
    expect(takes.leastToughness.value).toBeCloseTo(40 / (reserveOnToughness ?? 1), 6);
    expect(takes.loadFactor).toBe(assess(CASE).reserveOnLoad);
  });

  it('says when no toughness would do', () => {
    const takes = whatItTakes(sampleInput({ membrane: 420 }));
    expect(takes).toMatchObject({ leastToughness: { status: 'never acceptable' } });
  });
});
