import { sensitivity } from '@ligament/domain/assessment/analyses/sensitivity';
import { tipState } from '@ligament/domain/assessment/analyses/tip-state';
import { sampleInput } from '@ligament/domain/assessment/testing/sample-input';
import { colourOf, scalePixels } from './map-colours';
import { movedRows, sensitivityChart, sensitivityTable } from './sensitivity-chart';
import { COLUMNS, ROWS, tipPixels, tipTable } from './tip-map';

function found() {
  const result = sensitivity(sampleInput());
  if (result.status === 'refused') throw new Error('refused');
  return result;
}

function tip() {
  const result = tipState(sampleInput());
  if (result.status === 'refused') throw new Error('refused');
  return result;
}

/** Colour of a place of the map, in millimetres from the tip. */
function colourAt(pixels: Uint8ClampedArray, reach: number, x: number, y: number): number[] {
  const column = Math.round(((x + reach) / (2 * reach)) * (COLUMNS - 1));
  const row = ROWS - 1 - Math.round(((y + 0.75 * reach) / (1.5 * reach)) * (ROWS - 1));
  const from = 4 * (row * COLUMNS + column);
  return [...pixels.slice(from, from + 3)];
}

describe('the bars of what moves the verdict', () => {
  it('leave out what does not move the figure', () => {
    const names = movedRows(found(), 'reserve').map(({ name }) => name);
    expect(names).toContain('Primary membrane stress');
    expect(names).not.toContain('Cycles per year');
  });

  it('stand longest first in both figures', () => {
    for (const moved of ['reserve', 'life'] as const) {
      const swings = movedRows(found(), moved).map(({ low, high }) =>
        moved === 'reserve'
          ? Math.abs((low.reserveOnLoad ?? 0) - (high.reserveOnLoad ?? 0))
          : Math.abs((low.years ?? 0) - (high.years ?? 0)),
      );
      expect(swings).toEqual([...swings].sort((a, b) => b - a));
    }
  });

  it('reach from the lower figure to the higher one', () => {
    const { series } = sensitivityChart(found(), 'reserve') as {
      series: { data: number[] }[];
    };
    const rows = [...movedRows(found(), 'reserve')].reverse();
    const [from, length] = series.map(({ data }) => data);
    rows.forEach(({ low, high }, i) => {
      const ends = [low.reserveOnLoad ?? 0, high.reserveOnLoad ?? 0];
      expect(from?.[i]).toBeCloseTo(Math.min(...ends), 12);
      expect((from?.[i] ?? 0) + (length?.[i] ?? 0)).toBeCloseTo(Math.max(...ends), 12);
    });
  });

  it('have every row in the table behind them', () => {
    expect(sensitivityTable(found()).rows).toHaveLength(found().rows.length);
  });
});

describe('the map around the tip', () => {
  it('darkens towards the tip and leaves the crack white', () => {
    const state = tip();
    const pixels = tipPixels(state, 'von Mises', state.reachMm);
    const light = (x: number, y: number) =>
      colourAt(pixels, state.reachMm, x, y).reduce((sum, each) => sum + each, 0);
    expect(light(0.9 * state.reachMm, 0)).toBeGreaterThan(light(0.02 * state.reachMm, 0));
    const middle = (0.75 * state.reachMm) / (ROWS - 1);
    expect(light(-0.9 * state.reachMm, middle)).toBeGreaterThan(300);
  });

  it('reads the singular field in its table: half the stress at four times the distance', () => {
    const { rows } = tipTable(tip(), 1);
    const ahead = rows.filter(([, angle]) => angle === 0);
    const at = (r: number) => Number(ahead.find(([distance]) => distance === r)?.[3]);
    expect(at(0.25) / at(1)).toBeCloseTo(2, 10);
  });

  it('has a scale that runs evenly from light to dark', () => {
    const sums = Array.from({ length: 11 }, (_, i) =>
      colourOf(i / 10).reduce((sum, each) => sum + each, 0),
    );
    expect(sums).toEqual([...sums].sort((a, b) => b - a));
    expect(scalePixels(5)).toHaveLength(20);
    expect([...scalePixels(5).slice(0, 3)]).toEqual([...colourOf(0)]);
  });
});
