import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { given, sampleInput } from '@ligament/domain/assessment/testing/sample-input';
import type { AssessedCase } from './assessed-case';
import { figuresOf } from './figures-of';
import { lifeOf } from './life-of';
import { assessedSize } from './size-words';

function caseOf(change: (input: AssessmentInput) => AssessmentInput): AssessedCase {
  const input = change(sampleInput({ membrane: 60, width: 600 }));
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(outcome.refusals[0]?.message);
  return { input, outcome, inspectedOn: '2026-11-10', dueOn: null, sizingError: null };
}

const ofKind = (kind: AssessmentInput['flaw']['kind'], heightMm: number, lengthMm: number) =>
  caseOf((input) => ({
    ...input,
    flaw: { ...input.flaw, kind, heightMm: given(heightMm), lengthMm: given(lengthMm) },
  }));

describe('the size of an assessed flaw', () => {
  it('of a corner flaw is its depth and its length from the edge', () => {
    const corner = ofKind('corner', 4, 5);
    expect(assessedSize(corner)).toMatchObject({
      heightMm: 5,
      lengthMm: 7,
      heightSymbol: 'a',
      lengthSymbol: 'c',
    });
    expect(figuresOf(corner).map(({ label }) => label)).toContain('Depth a, last measured');
    expect(figuresOf(corner)[0]?.note).toBe('assessed at 5 mm');
  });

  it('of a flaw through the wall is its length, and so is its limit and its way', () => {
    const through = ofKind('through-wall', 25, 40);
    expect(assessedSize(through)).toMatchObject({ lengthMm: 42, byHeight: false });
    const labels = figuresOf(through).map(({ label }) => label);
    expect(labels).toEqual(expect.arrayContaining(['Through the wall', 'Limiting length']));
    const surroundings = { measured: [], windows: [], basis: '', today: '2026-12-01' };
    const life = lifeOf(through, surroundings);
    expect(life.quantity).toBe('length');
    expect(life.predicted[0]?.heightMm).toBeCloseTo(42, 9);
  });

  it('of a flaw through an edge is what it takes of the width', () => {
    expect(assessedSize(ofKind('edge', 25, 20))).toMatchObject({ lengthMm: 22, lengthSymbol: 'c' });
  });
});
