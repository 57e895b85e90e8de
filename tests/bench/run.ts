import { mkdtempSync, rmSync } from 'node:fs';
import { cpus, loadavg, tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { assessmentBench } from './assessment-bench';
import { benchBundle, engineBundle } from './bundle-engine';
import type * as Engine from './engine-entry';
import { livesBench } from './lives-bench';
import { mapBench } from './map-bench';

/** Largest engine a browser should have to load [kB, gzipped]. */
const BUNDLE_AIM_KB = 60;

const say = (line: string) => process.stdout.write(`${line}\n`);

const folder = mkdtempSync(join(tmpdir(), 'ligament-bench-'));
try {
  const file = join(folder, 'engine.mjs');
  await benchBundle(file);
  const engine = (await import(pathToFileURL(file).href)) as typeof Engine;
  const [processor] = cpus();
  say(
    `${cpus().length} × ${processor?.model ?? 'processor'}, Node ${process.version}, load ${loadavg()
      .map((x) => x.toFixed(1))
      .join(' ')}`,
  );
  say('\nLife of a surface flaw');
  livesBench(engine, folder, say);
  say('\nOne assessment');
  assessmentBench(engine, say);
  say('\nStress map around a crack');
  mapBench(engine, say);
  say('\nThe engine in a browser');
  const { bytes, gzipped } = await engineBundle();
  const met = gzipped / 1000 <= BUNDLE_AIM_KB ? 'met' : 'NOT met';
  say(
    `${(bytes / 1000).toFixed(1)} kB, gzipped ${(gzipped / 1000).toFixed(1)} kB, aim ≤ ${BUNDLE_AIM_KB} kB ${met}`,
  );
} finally {
  rmSync(folder, { recursive: true, force: true });
}
