import { assess } from './testing/assess';

describe('the growing flaw', () => {
  it('ends on the line of the diagram', () => {
    const flaw = assess({ toughness: 30, cycles: 50_000 });
    expect(flaw.life.end).toBe('limit reached');
    const last = flaw.path[flaw.path.length - 1];
    const there = assess({
      toughness: 30,
      height: (last?.heightMm ?? 0) - 1,
      length: (last?.lengthMm ?? 0) - 2,
    });
    expect(there.reserveOnLoad).toBeCloseTo(1, 5);
  });

  it('never gives a longer life as a figure than was computed', () => {
    const flaw = assess({ toughness: 50, cycles: 50_000 });
    const last = flaw.path[flaw.path.length - 1];
    expect(flaw.life.years).toBeLessThanOrEqual(last?.years ?? 0);
    expect((last?.years ?? 0) - (flaw.life.years ?? 0)).toBeLessThan(0.01);
  });

  it('stops at the horizon and says so', () => {
    const flaw = assess({ cycles: 10, horizon: 25 });
    expect(flaw.life).toMatchObject({ years: 25, end: 'horizon' });
  });

  it('never states a figure beyond 40 years', () => {
    const flaw = assess({ cycles: 1, horizon: 60 });
    expect(flaw.life.because).toMatch(/the whole time it was followed, more than 40 years/);
  });

  it('does not grow below the threshold', () => {
    const flaw = assess({ range: 5 });
    expect(flaw.life).toMatchObject({ end: 'no growth', years: 40 });
    expect(flaw.path).toHaveLength(2);
    expect(flaw.path[1]).toMatchObject({ years: 40, heightMm: 5 });
  });

  it('does not grow without a cause', () => {
    expect(assess({ cycles: 0 }).life.end).toBe('no growth');
  });

  it('grows by a constant rate of stress corrosion until a/t = 0.8', () => {
    const flaw = assess({ cycles: 0, stressCorrosion: 0.5, membrane: 40, toughness: 300 });
    expect(flaw.life).toMatchObject({ years: 30, end: 'through-wall' });
    const last = flaw.path[flaw.path.length - 1];
    expect(last?.heightMm).toBeCloseTo(20, 8);
    expect(last?.lengthMm).toBeCloseTo(26 + 2 * 0.5 * 30, 5);
  });

  it('is shorter with fatigue and stress corrosion together than with either', () => {
    const years = (v: Parameters<typeof assess>[0]) =>
      assess({ toughness: 60, ...v }).life.years ?? 0;
    const both = years({ cycles: 40_000, stressCorrosion: 0.2 });
    expect(both).toBeLessThan(years({ cycles: 40_000 }));
    expect(both).toBeLessThan(years({ cycles: 0, stressCorrosion: 0.2 }));
  });

  it('keeps between 30 and 62 states for drawing, in the order of time', () => {
    const { path } = assess({ toughness: 50, cycles: 50_000 });
    expect(path.length).toBeGreaterThanOrEqual(30);
    expect(path.length).toBeLessThanOrEqual(62);
    const years = path.map((state) => state.years);
    expect(years).toEqual([...years].sort((x, y) => x - y));
  });

  it('halves the life when the cycles double', () => {
    const years = (cycles: number) => {
      const { path } = assess({ toughness: 50, cycles, horizon: 100 });
      return path[path.length - 1]?.years ?? 0;
    };
    expect(years(40_000) / years(80_000)).toBeCloseTo(2, 6);
  });

  it('turns an embedded flaw into a surface flaw on the way, with the jump reported', () => {
    const flaw = assess({
      kind: 'embedded',
      height: 6,
      ligament: 5,
      membrane: 150,
      toughness: 150,
      cycles: 30_000,
    });
    expect(flaw.events.map(({ to }) => to)).toEqual(['surface', 'through-wall']);
    const [event] = flaw.events;
    expect(event).toMatchObject({ from: 'embedded', to: 'surface' });
    expect(event?.rule).toMatch(/from memory/);
    expect(event?.heightAfterMm).toBeGreaterThan(event?.heightBeforeMm ?? 0);
    expect(flaw.life.firstEventYears).toBeLessThanOrEqual(event?.years ?? 0);
    const kinds = flaw.path.map(({ kind }) => kind);
    expect(kinds.indexOf('surface')).toBeGreaterThan(kinds.lastIndexOf('embedded'));
  });

  it('keeps the centre of an embedded flaw where it is while it grows', () => {
    const { path } = assess({
      kind: 'embedded',
      height: 6,
      ligament: 5,
      membrane: 150,
      toughness: 150,
      cycles: 30_000,
    });
    const embedded = path.filter(({ kind }) => kind === 'embedded');
    for (const { heightMm, ligamentMm } of embedded)
      expect(ligamentMm + heightMm / 2).toBeCloseTo(8, 8);
  });

  it('takes an embedded flaw close to the face as a surface flaw from the start', () => {
    const flaw = assess({ kind: 'embedded', height: 6, ligament: 1.5 });
    expect(flaw.solution.stressIntensity).toMatch(/surface flaw/);
    expect(flaw.assessed.heightMm).toBeCloseTo(8, 10);
    expect(flaw.cautions.join(' ')).toMatch(/assessed as a surface flaw 8 mm deep/);
  });

  it('turns the bending over for an embedded flaw that breaks through to the other face', () => {
    const far = assess({ kind: 'embedded', height: 6, ligament: 17.6, bending: 60 });
    const near = assess({ kind: 'embedded', height: 6, ligament: 1.4, bending: -60 });
    expect(far.kPrimaryMPaSqrtM).toBeCloseTo(near.kPrimaryMPaSqrtM, 8);
  });

  it('lets pressure reach the faces of an embedded flaw only when it opens to the bore', () => {
    const flaw = (ligament: number, facePressure: number) =>
      assess({ kind: 'embedded', height: 6, ligament, facePressure }).kPrimaryMPaSqrtM;
    expect(flaw(10, 20)).toBe(flaw(10, 0));
    expect(flaw(1.4, 20)).toBeGreaterThan(flaw(1.4, 0));
    expect(flaw(17.6, 20)).toBe(flaw(17.6, 0));
  });
});
