import { pino } from 'pino';
import { everyMinute } from './maintenance';

function maintained(start: string) {
  const state = { written: false, now: new Date(start), done: [] as string[] };
  const minute = everyMinute({
    upkeep: {
      maintain: (...statements) => {
        state.done.push(...statements);
        return Promise.resolve();
      },
      takeWritten: () => {
        const { written } = state;
        state.written = false;
        return written;
      },
    },
    tableNames: ['flaws', 'history'],
    log: pino({ level: 'silent' }),
    now: () => state.now,
  });
  return { state, minute };
}

describe('everyMinute', () => {
  it('writes a checkpoint only when something was written', async () => {
    const { state, minute } = maintained('2026-12-01T12:00:00');
    await minute();
    expect(state.done).toEqual([]);
    state.written = true;
    await minute();
    await minute();
    expect(state.done).toEqual(['checkpoint']);
  });

  it('brings the statistics up to date after an hour of writing', async () => {
    const { state, minute } = maintained('2026-12-01T12:00:00');
    for (let count = 0; count < 61; count += 1) {
      state.written = true;
      await minute();
    }
    expect(state.done.filter((statement) => statement === 'analyze')).toHaveLength(1);
  });

  it('clears away dead rows once a night, table by table', async () => {
    const { state, minute } = maintained('2026-12-01T22:00:00');
    state.now = new Date('2026-12-02T03:00:10');
    await minute();
    state.now = new Date('2026-12-02T03:01:10');
    await minute();
    expect(state.done).toEqual(['vacuum (analyze) "flaws"', 'vacuum (analyze) "history"']);
  });
});
