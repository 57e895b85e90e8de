import type { SectionDrawing } from './section-drawing';
import { sectionGeometry } from './section-geometry';

const surface = (heightMm: number, lengthMm: number, face: 'inside' | 'outside' = 'inside') => ({
  kind: 'surface' as const,
  face,
  heightMm,
  lengthMm,
  oneSided: false,
  middleMm: null,
  label: `${heightMm} mm`,
});
const drawing = (over: Partial<SectionDrawing> = {}): SectionDrawing => ({
  wallMm: 28,
  measured: surface(7.6, 74),
  assessed: surface(8.6, 76),
  expected: surface(9.1, 77),
  limiting: surface(9.7, 78),
  ...over,
});

/** Radii and ends of the arc of a surface flaw's path. */
function arcOf(path: string) {
  const numbers = path.match(/-?\d+(\.\d+)?/g)?.map(Number) ?? [];
  const [left, y, rx, ry, , , sweep, right] = numbers;
  return { left, y, rx, ry, sweep, right };
}

describe('sectionGeometry', () => {
  it('draws heights and lengths with one scale', () => {
    const shape = sectionGeometry(drawing(), 900);
    const measured = shape.outlines.find(({ part }) => part === 'measured');
    const { rx, ry } = arcOf(measured?.path ?? '');
    expect(ry).toBeCloseTo(7.6 * shape.scale, 1);
    expect(rx).toBeCloseTo(37 * shape.scale, 1);
    expect(shape.wall.bottom - shape.wall.top).toBeCloseTo(28 * shape.scale, 6);
  });

  it('puts a flaw of the inside surface on the lower face and one of the outside on the upper', () => {
    const inside = sectionGeometry(drawing(), 900);
    expect(arcOf(inside.outlines.at(-1)?.path ?? '')).toMatchObject({
      y: expect.closeTo(inside.wall.bottom, 1),
      sweep: 1,
    });
    const outside = sectionGeometry(
      drawing({ measured: surface(7.6, 74, 'outside'), assessed: surface(8.6, 76, 'outside') }),
      900,
    );
    expect(arcOf(outside.outlines.at(-1)?.path ?? '')).toMatchObject({
      y: expect.closeTo(outside.wall.top, 1),
      sweep: 0,
    });
  });

  it('measures the ligament from the tip of the assessed flaw to the other face', () => {
    const { ligament, scale, wall } = sectionGeometry(drawing(), 900);
    expect(ligament?.text).toBe('ligament 19.4 mm');
    expect(ligament?.y2).toBeCloseTo(wall.top, 6);
    expect((ligament?.y1 ?? 0) - (ligament?.y2 ?? 0)).toBeCloseTo(19.4 * scale, 6);
  });

  it('measures the ligament of an embedded flaw to the nearer face', () => {
    const embedded = { ...surface(6, 40), kind: 'embedded' as const, middleMm: 20 };
    const { ligament, wall } = sectionGeometry(
      drawing({ measured: embedded, assessed: embedded, expected: null, limiting: null }),
      900,
    );
    expect(ligament?.text).toBe('ligament 5 mm');
    expect(ligament?.y2).toBeCloseTo(wall.top, 6);
  });

  it('keeps the widest outline inside the room beside the labels', () => {
    const { outlines, labels } = sectionGeometry(drawing(), 900);
    const { right } = arcOf(outlines[0]?.path ?? '');
    expect(right).toBeLessThan(Math.min(...labels.map(({ x }) => x)));
  });

  it('keeps labels apart and leaves them out where the drawing is narrow', () => {
    const { labels } = sectionGeometry(drawing(), 900);
    const rows = labels.map(({ y }) => y).sort((a, b) => a - b);
    for (const [i, row] of rows.slice(1).entries())
      expect(row - (rows[i] ?? 0)).toBeGreaterThanOrEqual(17.9);
    expect(sectionGeometry(drawing(), 360).labels).toEqual([]);
  });

  it('leads each label to its own outline, on whichever face the flaw is', () => {
    const outside = sectionGeometry(
      drawing({
        measured: surface(5, 30, 'outside'),
        assessed: surface(6, 32, 'outside'),
        expected: null,
        limiting: surface(14, 50, 'outside'),
      }),
      900,
    );
    const lowest = outside.wall.top + 14 * outside.scale;
    for (const { fromY } of outside.labels) {
      expect(fromY).toBeGreaterThanOrEqual(outside.wall.top);
      expect(fromY).toBeLessThanOrEqual(lowest);
    }
  });

  it('draws a limit that is already passed on top of the flaw', () => {
    const passed = sectionGeometry(drawing({ expected: null, limiting: surface(4, 76) }), 900);
    expect(passed.outlines.map(({ part }) => part)).toEqual(['assessed', 'measured', 'limiting']);
  });

  it('cuts a very long flaw rather than drawing a wall too thin to see', () => {
    const long = sectionGeometry(drawing({ measured: surface(7.6, 900), limiting: null }), 700);
    expect(long.cut).toBe(true);
    expect(long.wall.bottom - long.wall.top).toBeGreaterThanOrEqual(63.9);
    expect(sectionGeometry(drawing(), 900).cut).toBe(false);
  });

  it('draws a corner flaw from the edge where the wall begins', () => {
    const corner = { ...surface(5, 4), kind: 'corner' as const, oneSided: true };
    const parts = { measured: corner, assessed: corner, expected: null, limiting: null };
    const { outlines, wall, scale, length, ligament } = sectionGeometry(drawing(parts), 900);
    expect(wall.left).toBeGreaterThan(0);
    expect(outlines.at(-1)?.path).toMatch(new RegExp(`^M ${wall.left} `));
    expect(length.x1).toBeCloseTo(wall.left, 6);
    expect(length.x2 - length.x1).toBeCloseTo(4 * scale, 6);
    expect(length.text).toBe('c 4 mm');
    expect(ligament?.text).toBe('ligament 23 mm');
  });

  it('draws a flaw through the wall over its whole height and without a ligament', () => {
    const through = { ...surface(28, 60), kind: 'through-wall' as const };
    const parts = { measured: through, assessed: through, expected: null, limiting: null };
    const { outlines, wall, ligament } = sectionGeometry(drawing(parts), 900);
    const path = outlines.at(-1)?.path ?? '';
    expect(path).toContain(` ${wall.top} H`);
    expect(path).toContain(`V ${wall.bottom}`);
    expect(ligament).toBeNull();
  });

  it('draws a flaw without end from side to side', () => {
    const endless = { ...surface(5, 900), kind: 'extended surface' as const };
    const parts = { measured: endless, assessed: endless, expected: null, limiting: null };
    const { outlines, wall, length, cut } = sectionGeometry(drawing(parts), 900);
    expect(outlines.at(-1)?.path).toMatch(new RegExp(`^M ${wall.left} .* H ${wall.right} `));
    expect(length.text).toBe('full length');
    expect(cut).toBe(false);
  });

  it('states a round length on the scale bar and draws it to that length', () => {
    const { scaleBar, scale } = sectionGeometry(drawing(), 900);
    expect(scaleBar.x2 - scaleBar.x1).toBeCloseTo(Number.parseFloat(scaleBar.text) * scale, 6);
  });
});
