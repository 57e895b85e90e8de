import { crackLaw } from '../materials/crack-law-library';
import { lawPerCycle, ratesPerYear } from './growth-rates';
import { matchBlocks } from './match-blocks';

const law = (key: string) => {
  const found = crackLaw(key);
  if (!found) throw new Error(`no law ${key}`);
  return found;
};
const block = (stressRatio?: number) => ({
  membraneRangeMPa: 100,
  bendingRangeMPa: 0,
  cyclesPerYear: 1000,
  ...(stressRatio === undefined ? {} : { stressRatio }),
});

describe('a law against the blocks of a histogram', () => {
  it('fits when every block has a ratio the law is for', () => {
    expect(matchBlocks(law('steel-air-high-upper'), [block(0.5), block(0.9), block()])).toEqual({
      status: 'matched',
      cautions: [],
    });
  });

  it('is refused when a block has a higher ratio than the law is for', () => {
    const outcome = matchBlocks(law('steel-air-low-upper'), [block(0.1), block(0.5)]);
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'growth.fatigue.blocks.1.stressRatio', value: 0.5 }],
    });
  });

  it('is taken with a word when it is for a higher ratio', () => {
    expect(matchBlocks(law('steel-air-high-upper'), [block(0.1)])).toMatchObject({
      cautions: [expect.stringMatching(/safe side/)],
    });
  });

  it('is refused when it needs a ratio and a block gives none', () => {
    for (const key of ['walker-4340', 'ferritic-air-code', 'steel-air-simplified-parent']) {
      expect(matchBlocks(law(key), [block()])).toMatchObject({ status: 'refused' });
    }
  });

  it('is refused without the temperature it needs, or at one it is not for', () => {
    const austenitic = law('austenitic-air-code');
    expect(matchBlocks(austenitic, [block(0.5)])).toMatchObject({
      refusals: [{ input: 'temperatureC' }],
    });
    expect(matchBlocks(austenitic, [block(0.5)], { temperatureC: 300 })).toMatchObject({
      status: 'matched',
    });
    expect(
      matchBlocks(law('steel-air-simplified'), [block()], { temperatureC: 300 }),
    ).toMatchObject({
      refusals: [{ input: 'temperatureC', value: 300 }],
    });
  });

  it('warns of a law for low ratios where none is given', () => {
    expect(matchBlocks(law('steel-air-low-mean'), [block()])).toMatchObject({
      cautions: [expect.stringMatching(/at a weld/)],
    });
  });

  it.each([Number.NaN, Infinity, 1, 50])('refuses a ratio of %d', (ratio) => {
    expect(matchBlocks(law('steel-air-high-mean'), [block(ratio)])).toMatchObject({
      status: 'refused',
    });
  });
});

describe('growth per year by stress ratio', () => {
  const rateAt = (key: string, stressRatio?: number, conditions?: { temperatureC: number }) => {
    const into = { a: 0, c: 0 };
    const blocks = [block(stressRatio)];
    ratesPerYear(
      {
        fatigue: { law: law(key), blocks, ...(conditions ? { conditions } : {}) },
        stressCorrosion: null,
      },
      { deepest: (m) => 5 * m, end: (m) => 3 * m },
    )(into);
    return into;
  };

  it('takes each block by its own ratio', () => {
    const rate = lawPerCycle(law('walker-2024-t3'));
    expect(rateAt('walker-2024-t3', 0.2)).toEqual({
      a: 1000 * rate(500, 0.2),
      c: 1000 * rate(300, 0.2),
    });
    expect(rateAt('walker-2024-t3', 0.6).a).toBeGreaterThan(rateAt('walker-2024-t3', 0.2).a);
  });

  it('takes the ratio of welds where none is given', () => {
    expect(rateAt('ferritic-water-code')).toEqual(rateAt('ferritic-water-code', 0.5));
  });

  it('hands the temperature on', () => {
    const hot = rateAt('austenitic-air-code', 0, { temperatureC: 400 });
    expect(hot.a).toBeGreaterThan(rateAt('austenitic-air-code', 0, { temperatureC: 20 }).a);
  });
});
