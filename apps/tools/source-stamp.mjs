// Tells whether dist/ was built from the sources as they are now.
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const SOURCES = [
  'apps',
  'libs',
  'db',
  'seeds',
  'angular.json',
  'package-lock.json',
  'tsconfig.json',
];
const STAMP = 'dist/source-stamp';

function hashInto(hash, path) {
  if (path.endsWith('.spec.ts') || !existsSync(path)) return;
  let entries;
  try {
    entries = readdirSync(path, { withFileTypes: true });
  } catch {
    hash.update(path).update(readFileSync(path));
    return;
  }
  for (const entry of entries.sort((a, b) => (a.name < b.name ? -1 : 1))) {
    if (!entry.name.startsWith('.')) hashInto(hash, join(path, entry.name));
  }
}

/** One hash over names and content of everything that goes into the build. */
export function sourceStamp(root) {
  const hash = createHash('sha256');
  for (const source of SOURCES) hashInto(hash, join(root, source));
  return hash.digest('hex');
}

export function isBuilt(root) {
  const file = join(root, STAMP);
  return existsSync(file) && readFileSync(file, 'utf8') === sourceStamp(root);
}

export function writeStamp(root) {
  mkdirSync(join(root, 'dist'), { recursive: true });
  writeFileSync(join(root, STAMP), sourceStamp(root));
}
