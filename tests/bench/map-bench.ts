import type * as Engine from './engine-entry';
import { cpuSeconds, quantile, spread } from './figures';

const [COLUMNS, ROWS] = [200, 150];
const AIM_MS = 1000 / 60;
const RUNS = 40;

/** Time to fill a map of the stress around a crack, by its exact field. */
export function mapBench(engine: typeof Engine, say: (line: string) => void): void {
  const values = new Float64Array(COLUMNS * ROWS);
  const mask = new Uint8Array(COLUMNS * ROWS);
  const request = {
    subject: { kind: 'crack', halfLengthMm: 10, stressMPa: 100, ratio: 0.5 },
    component: 'von Mises',
    condition: 'plane strain',
    poisson: 0.3,
    grid: { leftMm: -20, rightMm: 20, bottomMm: -15, topMm: 15, columns: COLUMNS, rows: ROWS },
    cap: 400,
    values,
    mask,
  } as const;
  const times = Array.from(
    { length: RUNS },
    () => 1000 * cpuSeconds(() => engine.stressMap(request)),
  );
  const warm = times.slice(RUNS / 4);
  const met = quantile(warm, 0.5) <= AIM_MS ? 'met' : 'NOT met';
  say(
    `${COLUMNS} × ${ROWS} points: first ${(times[0] ?? 0).toFixed(1)} ms, then ${spread(warm, 1)} ms, aim ≤ ${AIM_MS.toFixed(1)} ms ${met}`,
  );
}
