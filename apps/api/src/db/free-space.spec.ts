import { tmpdir } from 'node:os';
import { StorageFull } from './database-failures';
import { freeSpaceGuard } from './free-space';

describe('freeSpaceGuard', () => {
  it('lets writes pass while there is room', () => {
    expect(freeSpaceGuard(tmpdir(), 1)).not.toThrow();
  });

  it('refuses them when less than the least is free', () => {
    expect(freeSpaceGuard(tmpdir(), Number.MAX_SAFE_INTEGER)).toThrow(StorageFull);
  });
});
