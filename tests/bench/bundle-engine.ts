import { build } from 'esbuild';
import { resolve } from 'node:path';
import { gzipSync } from 'node:zlib';

export const ROOT = resolve(import.meta.dirname, '../..');

/** The engine as a browser would load it, without schema or server: its text and its sizes. */
export async function engineBundle() {
  const { outputFiles, metafile } = await build({
    absWorkingDir: ROOT,
    entryPoints: ['libs/domain/src/assessment/assess-flaw.ts'],
    bundle: true,
    minify: true,
    format: 'esm',
    platform: 'browser',
    target: 'es2022',
    metafile: true,
    write: false,
    logLevel: 'silent',
  });
  const text = outputFiles[0]?.text ?? '';
  return {
    text,
    inputs: Object.keys(metafile.inputs),
    bytes: Buffer.byteLength(text),
    gzipped: gzipSync(text, { level: 9 }).length,
  };
}

/** Bundles the entry of the bench for Node and answers its file. */
export async function benchBundle(file: string): Promise<void> {
  await build({
    absWorkingDir: ROOT,
    entryPoints: ['tests/bench/engine-entry.ts'],
    bundle: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    outfile: file,
    logLevel: 'silent',
  });
}
