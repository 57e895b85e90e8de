import type * as Engine from './engine-entry';
import { cpuSeconds, quantile, spread } from './figures';

/** One frame of a screen at 60 Hz [ms]. */
const FRAME_MS = 1000 / 60;
const RUNS = 60;

/** Time of one whole assessment with its calculation sheet, by kind of flaw. */
export function assessmentBench(engine: typeof Engine, say: (line: string) => void): void {
  const cases = [
    ['surface flaw in a plate', engine.sampleInput({ toughness: 50, cycles: 50_000 })],
    [
      'surface flaw in a cylinder',
      engine.sampleInput({ insideDiameter: 800, toughness: 60, cycles: 50_000 }),
    ],
    [
      'embedded flaw that breaks through',
      engine.sampleInput({
        kind: 'embedded',
        height: 6,
        ligament: 5,
        membrane: 150,
        toughness: 150,
        cycles: 30_000,
      }),
    ],
  ] as const;
  for (const [name, input] of cases) {
    const times = Array.from(
      { length: RUNS },
      () => 1000 * cpuSeconds(() => engine.assessFlaw(input)),
    );
    // the first runs are those of a compiler that does not know the code yet
    const warm = times.slice(RUNS / 3);
    const met = quantile(warm, 0.5) <= FRAME_MS ? 'met' : 'NOT met';
    say(
      `${name.padEnd(34)} first ${(times[0] ?? 0).toFixed(1)} ms, then ${spread(warm, 1)} ms, aim ≤ ${FRAME_MS.toFixed(1)} ms ${met}`,
    );
  }
}
