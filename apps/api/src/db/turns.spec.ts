import { setTimeout as wait } from 'node:timers/promises';
import { Turns } from './turns';

describe('Turns', () => {
  it('runs one piece of work at a time, in the order they came', async () => {
    const turns = new Turns();
    const seen: string[] = [];
    const work = (name: string) => async () => {
      seen.push(`${name} starts`);
      await wait(2);
      seen.push(`${name} ends`);
    };
    await Promise.all([turns.take(work('a')), turns.take(work('b')), turns.take(work('c'))]);
    expect(seen).toEqual(['a starts', 'a ends', 'b starts', 'b ends', 'c starts', 'c ends']);
  });

  it('goes on after work that failed', async () => {
    const turns = new Turns();
    const failing = turns.take(() => Promise.reject(new Error('no')));
    const next = turns.take(() => Promise.resolve('yes'));
    await expect(failing).rejects.toThrow('no');
    await expect(next).resolves.toBe('yes');
  });

  it('lets what a person waits for go before batch work', async () => {
    const turns = new Turns();
    const seen: string[] = [];
    const note = (name: string) => () => {
      seen.push(name);
      return Promise.resolve();
    };
    await Promise.all([
      turns.take(() => wait(2)),
      turns.take(note('batch'), 'batch'),
      turns.take(note('person 1')),
      turns.take(note('person 2')),
    ]);
    expect(seen).toEqual(['person 1', 'person 2', 'batch']);
  });

  it('does not let batch work wait for ever', async () => {
    const turns = new Turns();
    let before = 0;
    let batchAfter = -1;
    const first = turns.take(() => wait(2));
    const batch = turns.take(() => {
      batchAfter = before;
      return Promise.resolve();
    }, 'batch');
    const others = Array.from({ length: 500 }, () =>
      turns.take(() => {
        before += 1;
        return Promise.resolve();
      }),
    );
    await Promise.all([first, batch, ...others]);
    expect(batchAfter).toBeGreaterThan(100);
    expect(batchAfter).toBeLessThan(300);
  });
});
