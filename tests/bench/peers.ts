import { execFileSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** A program in another language that computes the same lives. */
export interface Peer {
  readonly name: string;
  /** Runs once over the first flaws: CPU seconds, evaluations, and the lives. */
  readonly run: (count: number) => PeerRun;
}

export interface PeerRun {
  readonly seconds: number;
  readonly evaluations: number;
  readonly cycles: Float64Array;
}

const HERE = join(import.meta.dirname, 'peers');
const FIELDS = 7;

interface Flaw {
  readonly thicknessMm: number;
  readonly widthMm: number;
  readonly depthMm: number;
  readonly halfLengthMm: number;
  readonly membraneRangeMPa: number;
  readonly bendingRangeMPa: number;
  readonly limitRangeMPaSqrtMm: number;
}

/** Writes the flaws where the peers read them, a wide plate as one of infinite width. */
export function writeFlaws(folder: string, flaws: readonly Flaw[]): void {
  const numbers = new Float64Array(flaws.length * FIELDS);
  flaws.forEach((f, i) => {
    const row = [f.thicknessMm, f.widthMm, f.depthMm, f.halfLengthMm, f.membraneRangeMPa];
    numbers.set([...row, f.bendingRangeMPa, f.limitRangeMPaSqrtMm], i * FIELDS);
  });
  writeFileSync(join(folder, 'flaws.bin'), Buffer.from(numbers.buffer));
}

/** The C program with a number of steps, compiled here for this processor; a word why not otherwise. */
export function cPeer(folder: string, steps: number): Peer | string {
  const program = join(folder, 'textbook-life');
  const source = join(HERE, 'textbook-life.c');
  try {
    execFileSync('gcc', ['-O3', '-march=native', source, '-lm', '-o', program], { stdio: 'pipe' });
  } catch {
    return 'no gcc';
  }
  return peer(`C ${steps} steps`, folder, program, (count) => [String(count), '1', String(steps)]);
}

/** NumPy over all flaws, or SciPy flaw by flaw; a word why not otherwise. */
export function pythonPeer(folder: string, how: 'numpy' | 'scipy', setting: string): Peer | string {
  try {
    execFileSync('python3', ['-c', `import ${how}`], { stdio: 'pipe' });
  } catch {
    return `no ${how}`;
  }
  const script = join(HERE, 'vectorised_life.py');
  const flags = (count: number) => [String(count), setting];
  return peer(how, folder, 'python3', flags, [script, how]);
}

function peer(
  name: string,
  folder: string,
  program: string,
  settings: (count: number) => string[],
  before: string[] = [],
): Peer {
  const target = join(folder, `cycles-${name.replaceAll(' ', '-')}.bin`);
  const run = (count: number): PeerRun => {
    const given = [...before, join(folder, 'flaws.bin'), target, ...settings(count)];
    const said = execFileSync(program, given, {
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    const { seconds, evaluations } = JSON.parse(said) as { seconds: number; evaluations: number };
    const bytes = readFileSync(target);
    const cycles = new Float64Array(bytes.buffer, bytes.byteOffset, count);
    return { seconds, evaluations, cycles };
  };
  return { name, run };
}
