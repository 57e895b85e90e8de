import { startOf } from './evidence';
import { rateCases, rowsOfCases } from './load-case-rows';

const start = startOf({ numbers: {} });
const TABLE = {
  ...start,
  kind: 'table' as const,
  lists: {
    ...start.lists,
    table: [
      { temperatureC: -40, kMPaSqrtM: 50 },
      { temperatureC: 20, kMPaSqrtM: 120 },
    ],
  },
};
const COLD = { name: 'Cold start', temperatureC: -40, stressFactor: 0.25 };
const WARM = { name: 'Operation', temperatureC: 20, stressFactor: 1 };

describe('rateCases', () => {
  it('shows the toughness of every case and marks the least for its stress', () => {
    const { answers, governing } = rateCases(rowsOfCases([COLD, WARM]), TABLE);
    // 50/0.25 = 200 against 120/1
    expect(governing).toEqual(WARM);
    expect(answers).toEqual([
      { text: '50 MPa√m', mark: '' },
      { text: '120 MPa√m', mark: 'governs' },
    ]);
  });

  it('takes an empty stress as that of the assessment and names the case by its place', () => {
    const rows = [{ temperatureC: 20 }, { temperatureC: -40, stressFactor: '' }];
    expect(rateCases(rows, TABLE).governing).toEqual({
      name: 'Load case 2',
      temperatureC: -40,
      stressFactor: 1,
    });
  });

  it('judges none while one of them is refused, and says which', () => {
    const tooCold = { ...COLD, temperatureC: -90 };
    const { governing, messages, answers } = rateCases(rowsOfCases([tooCold, WARM]), TABLE);
    expect(governing).toBeNull();
    expect(messages.get('loadCases.0.temperatureC')).toContain('Cold start');
    expect(answers[1]).toEqual({ text: '120 MPa√m', mark: '' });
    const noStress = { ...WARM, stressFactor: 0 };
    expect([...rateCases(rowsOfCases([noStress]), TABLE).messages.keys()]).toEqual([
      'loadCases.0.stressFactor',
    ]);
  });
});
