import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import { sampleInput, type Variation } from '@ligament/domain/assessment/testing/sample-input';
import type { AssessedCase } from './assessed-case';
import { diagramOf, diagramTable } from './diagram-of';
import { figuresOf } from './figures-of';
import { inputName, weakInputs } from './input-names';
import { lifeOf } from './life-of';
import { lifeWords } from './life-words';
import { atLimit, atNextInspection } from './milestones';
import { sectionOf } from './section-of';
import { stateAt } from './state-at';
import { verdictSentence } from './verdict-words';

function caseOf(variation: Variation = {}, dueOn: string | null = '2027-11-10'): AssessedCase {
  const input = sampleInput(variation);
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(outcome.refusals[0]?.message);
  return {
    input,
    outcome,
    inspectedOn: '2026-11-10',
    dueOn,
    sizingError: { heightMm: 0.7, lengthMm: 3 },
  };
}
const surroundings = { measured: [], windows: [], basis: '', today: '2026-12-01' };

describe('the drawings of an assessed flaw', () => {
  it('show the flaw measured, assessed, expected and at its limit, each larger than the one before', () => {
    const { measured, assessed, expected, limiting } = sectionOf(caseOf({ height: 8 }));
    const heights = [measured, assessed, expected, limiting].map((each) => each?.heightMm ?? 0);
    expect(heights).toEqual([...heights].sort((a, b) => a - b));
    expect(measured.label).toBe('measured 8 ± 0.7 mm deep');
    expect(assessed.heightMm).toBe(9);
  });

  it('keep the middle of an embedded flaw where it is, whichever face it is measured from', () => {
    const inside = sectionOf(caseOf({ kind: 'embedded', height: 4, ligament: 8 }));
    expect(inside.measured.middleMm).toBe(10);
    const outside = sectionOf(
      caseOf({ kind: 'embedded', face: 'outside', height: 4, ligament: 8 }),
    );
    expect(outside.measured.middleMm).toBe(15);
    expect(outside.assessed.middleMm).toBe(15);
  });

  it('put the point of the diagram where the engine says, and the same numbers in its table', () => {
    const each = caseOf();
    const { now, outside, limit } = diagramOf(each);
    expect([now.lr, now.kr]).toEqual([each.outcome.lr, each.outcome.kr]);
    expect(outside).toBe(false);
    expect(limit).not.toBeNull();
    expect(diagramTable(each).rows).toHaveLength(
      each.outcome.path.length + each.outcome.line.length,
    );
  });

  it('show no next inspection and no growth for a flaw that is not acceptable', () => {
    const each = caseOf({ height: 18, membrane: 260 }, null);
    expect(each.outcome.verdict).toBe('not acceptable');
    expect(sectionOf(each).expected).toBeNull();
    expect(diagramOf(each)).toMatchObject({ next: null, limit: null, outside: true });
    expect(lifeOf(each, surroundings)).toMatchObject({ due: null, limit: null });
  });

  it('end the life line on the day the engine predicts', () => {
    const each = caseOf({ height: 8 });
    const life = lifeOf(each, surroundings);
    expect(life.limit?.on).toBe(atLimit(each)?.on);
    expect(life.predicted[0]).toEqual({ on: '2026-11-10', heightMm: 9 });
    expect(life.due?.label).toBe('inspect by 10 Nov 2027');
  });
});

describe('stateAt', () => {
  it('lies between the states it stands between', () => {
    const { path } = caseOf({ height: 8 }).outcome;
    const [first, second] = path;
    const middle = stateAt(path, ((second?.years ?? 0) + (first?.years ?? 0)) / 2);
    expect(middle?.heightMm).toBeCloseTo(((first?.heightMm ?? 0) + (second?.heightMm ?? 0)) / 2, 9);
  });

  it('knows nothing beyond the last state', () => {
    const { path } = caseOf().outcome;
    expect(stateAt(path, (path.at(-1)?.years ?? 0) + 1)).toBeNull();
    expect(stateAt([], 1)).toBeNull();
  });

  it('is asked for the day of the next inspection', () => {
    const each = caseOf({ height: 8 }, '2026-11-10');
    expect(atNextInspection(each)?.state.heightMm).toBe(9);
  });
});

describe('words and figures', () => {
  it('never shows a bare number', () => {
    for (const { unit, value, note } of figuresOf(caseOf())) {
      expect(unit || value === 'none').toBeTruthy();
      expect(note).toBeTruthy();
    }
  });

  it('never shows a long life as a figure', () => {
    const life = { years: 40, cycles: null, because: '', firstEventYears: null };
    expect(lifeWords({ ...life, end: 'horizon' })).toEqual({ value: 'over 40', unit: 'years' });
    expect(lifeWords({ ...life, years: 62, end: 'limit reached' }).value).toBe('over 40');
    expect(lifeWords({ ...life, end: 'no growth' }).value).toBe('no growth');
    expect(lifeWords({ ...life, years: null, end: 'already at limit' }).value).toBe('none');
  });

  it('answers the first question in one sentence', () => {
    expect(verdictSentence('acceptable', '2027-07-23')).toBe(
      'Acceptable, to be inspected again by 23 Jul 2027.',
    );
    expect(verdictSentence('not acceptable', null)).toMatch(/^Not acceptable: repair/);
  });

  it('names inputs in the trade’s words, with their unit and their place in a list', () => {
    expect(inputName('material.toughnessMPaSqrtM')).toEqual({
      name: 'Fracture toughness',
      unit: 'MPa√m',
    });
    expect(inputName('growth.fatigue.blocks.1.cyclesPerYear').name).toBe('Cycles, 2');
  });

  it('tells an assumption from a standard’s default', () => {
    const input = sampleInput();
    const marked = {
      ...input,
      material: {
        ...input.material,
        poissonsRatio: { value: 0.3, provenance: 'standard default' as const, note: '' },
      },
    };
    expect(weakInputs(marked, ['material.poissonsRatio', 'wall.thicknessMm'])).toEqual({
      assumed: ['wall thickness'],
      defaults: ['Poisson’s ratio'],
    });
  });
});
