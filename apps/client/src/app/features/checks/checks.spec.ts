import { CHECK_ROWS } from '@ligament/domain/verification/checks';
import type { CheckResult } from '@ligament/domain/verification/check-row';
import { lastValueFrom, toArray } from 'rxjs';
import { evaluateInTurns, GROUPS, summarise } from './evaluate-in-turns';

const result = (over: Partial<CheckResult>): CheckResult => ({
  id: 'X-1',
  group: GROUPS[0] ?? '',
  quantity: 'x',
  published: 1,
  unit: '',
  tolerance: 0.01,
  kind: 'closed form',
  source: 'test',
  computed: 1.005,
  deviation: 0.005,
  met: true,
  ...over,
});

describe('the page of checks', () => {
  it('computes every value, one group at a turn', async () => {
    const turns = await lastValueFrom(evaluateInTurns().pipe(toArray()));
    expect(turns).toHaveLength(GROUPS.length);
    expect(
      turns
        .at(-1)
        ?.map(({ id }) => id)
        .sort(),
    ).toEqual(CHECK_ROWS.map(({ id }) => id).sort());
    expect(new Set(turns[0]?.map(({ group }) => group))).toEqual(new Set([GROUPS[0]]));
  });

  it('tells of each group how much of a tolerance its worst value uses', () => {
    const [summary] = summarise([result({}), result({ id: 'X-2', deviation: -0.02, met: false })]);
    expect(summary).toMatchObject({ values: 2, met: 1, worst: 2 });
  });

  it('lets an exact count have no tolerance', () => {
    const exact = { tolerance: 0, deviation: 0 };
    expect(summarise([result(exact)])[0]?.worst).toBe(0);
    expect(summarise([result({ ...exact, deviation: 1 })])[0]?.worst).toBe(Infinity);
  });
});
