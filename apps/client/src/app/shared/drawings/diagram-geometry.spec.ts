import { type DiagramDrawing, diagramGeometry } from './diagram-geometry';

const drawing = (over: Partial<DiagramDrawing> = {}): DiagramDrawing => ({
  line: [
    { lr: 0, kr: 1 },
    { lr: 1.2, kr: 0.4 },
    { lr: 1.2, kr: 0 },
  ],
  lrMax: 1.2,
  now: { lr: 0.6, kr: 0.5, label: 'now' },
  outside: false,
  path: [
    { lr: 0.6, kr: 0.5 },
    { lr: 0.9, kr: 0.7 },
  ],
  next: { lr: 0.7, kr: 0.55, label: 'next inspection' },
  limit: { lr: 0.9, kr: 0.7, label: '4 Apr 2028' },
  ...over,
});

describe('diagramGeometry', () => {
  it('sets a point where its ratios lie between the axes', () => {
    const shape = diagramGeometry(drawing(), 460);
    const now = shape.points.find(({ part }) => part === 'now');
    const [zero, tick] = [shape.left, shape.xTicks.find(({ text }) => text === '0.6')];
    expect(now?.x).toBeCloseTo(tick?.at ?? Number.NaN, 6);
    expect(now?.x).toBeGreaterThan(zero);
    const [low, high] = [0.4, 0.6].map(
      (kr) => shape.yTicks.find(({ text }) => text === String(kr))?.at ?? Number.NaN,
    );
    expect(now?.y).toBeCloseTo(((low ?? 0) + (high ?? 0)) / 2, 6);
  });

  it('has the cut-off inside the drawing', () => {
    const { cutOff, right } = diagramGeometry(drawing(), 460);
    expect(cutOff.at).toBeLessThan(right);
    expect(cutOff.text).toBe('Lr,max 1.2');
  });

  it('sets a point far outside on the edge and says so', () => {
    const far = diagramGeometry(
      drawing({
        now: { lr: 9, kr: 7, label: 'now' },
        outside: true,
        path: [],
        next: null,
        limit: null,
      }),
      460,
    );
    expect(far.clamped).toBe(true);
    expect(far.points[0]?.x).toBeCloseTo(far.right, 6);
    expect(far.points[0]?.y).toBeCloseTo(far.top, 6);
    expect(diagramGeometry(drawing(), 460).clamped).toBe(false);
  });

  it('leaves no label over another, and none outside', () => {
    const { points, right } = diagramGeometry(drawing(), 460);
    const boxes = points.map(({ labelX, labelY, anchor, text }) => {
      const width = text.length * 6.1;
      const left =
        anchor === 'start' ? labelX : anchor === 'end' ? labelX - width : labelX - width / 2;
      return { left, right: left + width, top: labelY - 11, bottom: labelY + 3 };
    });
    for (const box of boxes) expect(box.right).toBeLessThanOrEqual(right + 1);
    for (const [i, one] of boxes.entries())
      for (const other of boxes.slice(i + 1)) {
        const apart =
          one.right <= other.left ||
          other.right <= one.left ||
          one.bottom <= other.top ||
          other.bottom <= one.top;
        expect(apart).toBe(true);
      }
  });
});
