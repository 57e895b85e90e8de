import { turningPoints } from './turning-points';

/** One counted cycle, or half of one. */
export interface CountedCycle {
  readonly range: number;
  readonly mean: number;
  readonly count: 0.5 | 1;
}

/** Counts a history as it comes; cycles are handed on in the order in which they close. */
export interface RainflowCounter {
  readonly push: (value: number) => void;
  /** Hands on what has not closed, each range as half a cycle. */
  readonly end: () => void;
}

/**
 * Rainflow counting by the three-point rule of ASTM E1049-85 5.4.4: a range that is not above the one before
 * it leaves that one behind as a cycle, or as half of one when it holds the start. What is left on the stack
 * at the end are half cycles. Every point is put on the stack and taken off once.
 */
export function rainflowCounter(
  emit: (cycle: CountedCycle) => void,
  { deadBand = 0 }: { readonly deadBand?: number } = {},
): RainflowCounter {
  const stack: number[] = [];
  const at = (fromTop: number) => stack[stack.length - fromTop] as number;
  const count = (one: number, other: number, share: 0.5 | 1) =>
    emit({ range: Math.abs(one - other), mean: (one + other) / 2, count: share });
  const close = () => {
    while (stack.length >= 3) {
      const [last, middle, first] = [at(1), at(2), at(3)];
      if (Math.abs(last - middle) < Math.abs(middle - first)) return;
      if (stack.length === 3) {
        count(first, middle, 0.5);
        stack.shift();
      } else {
        count(first, middle, 1);
        stack.length -= 3;
        stack.push(last);
      }
    }
  };
  const points = turningPoints(deadBand, (value) => {
    stack.push(value);
    close();
  });
  return {
    push: points.push,
    end: () => {
      points.end();
      for (let i = 1; i < stack.length; i++) count(stack[i - 1] as number, stack[i] as number, 0.5);
      stack.length = 0;
    },
  };
}
