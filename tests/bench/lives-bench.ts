import { cpuSeconds, errors, quantile, spread } from './figures';
import { cPeer, pythonPeer, writeFlaws, type Peer } from './peers';
import type * as Engine from './engine-entry';

const FLAWS = 10_000;
const ROUNDS = 11;
/** Slow ones look at fewer flaws, the first of the same list. */
const FEW = 200;
/** Steps of the C program: what a textbook takes, and the fewest that hold 0.1 % for every flaw. */
const TEXTBOOK_STEPS = 10;
const EQUAL_STEPS = 12;
/** Relative tolerance of SciPy: the largest power of ten that holds 0.1 %. */
const SCIPY_TOLERANCE = '1e-5';
const REFERENCE = {
  aspect: 1e-10,
  cycles: 1e-9,
  event: 1e-8,
  firstStep: 0.05,
  longestStep: 0.1,
  mostEvaluations: 1e6,
};

interface Runner {
  readonly name: string;
  readonly flaws: number;
  readonly run: () => { seconds: number; cycles: ArrayLike<number>; evaluations: number };
}

/** Lives per second and error of every way to compute them, and whether the aims are met. */
export function livesBench(engine: typeof Engine, folder: string, say: (line: string) => void) {
  const flaws = engine.randomFlaws(FLAWS);
  writeFlaws(folder, flaws);
  const table = engine.tableOf(flaws);
  const reference = engine.surfaceFlawLives(table, engine.TWO_STAGES, REFERENCE).cycles;
  const peers = [
    cPeer(folder, TEXTBOOK_STEPS),
    cPeer(folder, EQUAL_STEPS),
    pythonPeer(folder, 'numpy', '10'),
    pythonPeer(folder, 'scipy', SCIPY_TOLERANCE),
  ];
  for (const peer of peers) if (typeof peer === 'string') say(`skipped: ${peer}`);
  const runners = [
    ...own(engine),
    ...peers.filter((peer): peer is Peer => typeof peer !== 'string').map(foreign),
  ];
  const last = new Map<string, ReturnType<Runner['run']>>();
  const perLife = new Map(runners.map(({ name }) => [name, [] as number[]]));
  for (let round = 0; round < ROUNDS; round++) {
    for (const { name, run, flaws: count } of runners) {
      const result = run();
      last.set(name, result);
      perLife.get(name)?.push(result.seconds / count);
    }
  }
  say(`${FLAWS} flaws, ${ROUNDS} rounds one after the other, CPU time, median [quartiles]`);
  for (const { name, flaws: count } of runners) {
    const result = last.get(name);
    if (!result) continue;
    const { median, most, worst } = errors(result.cycles, reference);
    const rate = 1 / quantile(perLife.get(name) ?? [], 0.5);
    say(
      `${name.padEnd(16)} ${rate.toFixed(0).padStart(8)} lives/s  ${(result.evaluations / count).toFixed(1).padStart(6)} evaluations  error ${median.toExponential(1)} / 99 % ${most.toExponential(1)} / worst ${worst.toExponential(1)}  (${count} flaws)`,
    );
  }
  const ratio = (fast: string, slow: string) => {
    const [x, y] = [perLife.get(fast), perLife.get(slow)];
    return x && y ? y.map((seconds, i) => seconds / (x[i] ?? 0)) : [];
  };
  const aim = (text: string, values: readonly number[], least: number) => {
    if (values.length === 0) return;
    const met = quantile(values, 0.5) >= least;
    say(
      `${text.padEnd(34)} ${spread(values).padEnd(22)} aim ≥ ${least}  ${met ? 'met' : 'NOT met'}`,
    );
  };
  for (const steps of [TEXTBOOK_STEPS, EQUAL_STEPS]) {
    const name = `C ${steps} steps`;
    aim(`one by one / ${name}`, ratio('one by one', name), 1);
    aim(`table / ${name}`, ratio('table', name), 2.2);
  }
  aim('table / NumPy', ratio('table', 'numpy'), 1.1);
  aim('table / SciPy RK45', ratio('table', 'scipy'), 200);
  accuracy(engine, reference, say);
}

function own(engine: typeof Engine): Runner[] {
  const flaws = engine.randomFlaws(FLAWS);
  const table = engine.tableOf(flaws);
  const cycles = new Float64Array(FLAWS);
  return [
    {
      name: 'table',
      flaws: FLAWS,
      run: () => {
        let lives = engine.surfaceFlawLives(table, engine.TWO_STAGES);
        const seconds = cpuSeconds(() => {
          for (let i = 0; i < 4; i++) lives = engine.surfaceFlawLives(table, engine.TWO_STAGES);
        });
        const evaluations = lives.evaluations.reduce((sum, n) => sum + n, 0);
        return { seconds: seconds / 4, cycles: lives.cycles, evaluations };
      },
    },
    {
      name: 'one by one',
      flaws: FLAWS,
      run: () => {
        let evaluations = 0;
        const seconds = cpuSeconds(() => {
          flaws.forEach((flaw, i) => {
            const life = engine.surfaceFlawLife(flaw, engine.TWO_STAGES);
            if (life.status === 'refused') return;
            cycles[i] = life.cycles;
            evaluations += life.evaluations;
          });
        });
        return { seconds, cycles, evaluations };
      },
    },
    {
      name: 'readable',
      flaws: FEW,
      run: () => {
        let evaluations = 0;
        const lives: number[] = [];
        const seconds = cpuSeconds(() => {
          for (const flaw of flaws.slice(0, FEW)) {
            const life = engine.readableLife(flaw, engine.TWO_STAGES, {});
            lives.push(life.cycles);
            evaluations += life.evaluations;
          }
        });
        return { seconds, cycles: lives, evaluations };
      },
    },
  ];
}

function foreign({ name, run }: Peer): Runner {
  const count = name === 'scipy' ? FEW : FLAWS;
  return { name, flaws: count, run: () => run(count) };
}

function accuracy(engine: typeof Engine, reference: Float64Array, say: (line: string) => void) {
  const table = engine.tableOf(engine.randomFlaws(FLAWS));
  const looks = [
    ['standard', engine.STANDARD, 1e-3, 45],
    ['audit', engine.AUDIT, 1e-5, 200],
  ] as const;
  for (const [name, setting, error, evaluations] of looks) {
    const first = engine.surfaceFlawLives(table, engine.TWO_STAGES, setting);
    const second = engine.surfaceFlawLives(table, engine.TWO_STAGES, setting);
    const { worst } = errors(first.cycles, reference);
    const within = first.evaluations.filter((n) => n <= evaluations).length / FLAWS;
    const same = first.cycles.every((x, i) => Object.is(x, second.cycles[i]));
    const mark = (met: boolean) => (met ? 'met' : 'NOT met');
    say(
      `${name}: worst error ${worst.toExponential(1)}, aim ${error} ${mark(worst <= error)}; ${(100 * within).toFixed(2)} % of flaws in ≤ ${evaluations} evaluations, most ${quantile(first.evaluations, 1)}, aim all ${mark(within === 1)}; twice the same bits: ${same ? 'yes' : 'NO'}`,
    );
  }
  const alone = engine.randomFlaws(FLAWS).map((flaw) => {
    const life = engine.surfaceFlawLife(flaw, engine.TWO_STAGES);
    return life.status === 'refused' ? Number.NaN : life.cycles;
  });
  const together = engine.surfaceFlawLives(table, engine.TWO_STAGES).cycles;
  const { worst } = errors(alone, together);
  say(
    `one by one against table: largest difference ${worst}, aim ≤ 1e-12 ${worst <= 1e-12 ? 'met' : 'NOT met'}`,
  );
}
