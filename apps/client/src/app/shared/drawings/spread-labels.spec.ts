import { axisTicks, roundStep } from './axis-ticks';
import { spreadLabels } from './spread-labels';

describe('spreadLabels', () => {
  it('leaves rows that are apart where they are', () => {
    expect(spreadLabels([10, 60, 110], 18, { from: 0, to: 200 })).toEqual([10, 60, 110]);
  });

  it('moves crowded rows apart in their order', () => {
    expect(spreadLabels([50, 50, 49], 18, { from: 0, to: 200 })).toEqual([67, 85, 49]);
  });

  it('pushes rows back from the end', () => {
    expect(spreadLabels([190, 195], 18, { from: 0, to: 200 })).toEqual([182, 200]);
  });
});

describe('axisTicks', () => {
  it('gives round values up to the end', () => {
    expect(axisTicks(1.15, 6)).toEqual([0, 0.2, 0.4, 0.6, 0.8, 1]);
    expect(axisTicks(28, 4)).toEqual([0, 10, 20]);
    expect(axisTicks(0)).toEqual([0]);
  });

  it.each([
    [0.19, 0.2],
    [3, 5],
    [7, 10],
    [1, 1],
  ])('rounds a step of %d to %d', (rough, step) => {
    expect(roundStep(rough)).toBeCloseTo(step, 12);
  });
});
