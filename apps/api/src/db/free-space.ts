import { statfsSync } from 'node:fs';
import { StorageFull } from './database-failures';

const LEAST_BYTES = 64 * 1024 * 1024;

/** A guard that throws StorageFull when less than 64 MB are free where the data lies; it looks at most once a second. */
export function freeSpaceGuard(folder: string, least = LEAST_BYTES): () => void {
  let lookedAt = 0;
  let full = false;
  return () => {
    if (Date.now() - lookedAt > 1000) {
      const { bavail, bsize } = statfsSync(folder);
      full = bavail * bsize < least;
      lookedAt = Date.now();
    }
    // a disk full on the write-ahead log would make the engine spin for ever
    if (full) throw new StorageFull('Less than 64 MB of disk are free.');
  };
}
