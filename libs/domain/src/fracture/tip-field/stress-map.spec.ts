import fc from 'fast-check';
import { mm, mpa } from '../../units/quantity';
import { firstPrincipal, secondPrincipal, vonMises } from '../principal-stress';
import { noStress } from '../stress-state';
import { mapFieldOf, type MapSubject } from './map-field';
import type { MapComponent, MapRequest } from './map-request';
import { nearTipShareAhead } from './near-tip-ratio';
import { MASK, stressMap } from './stress-map';
import { westergaardField } from './westergaard-field';

const CRACK: MapSubject = { kind: 'crack', halfLengthMm: 10, stressMPa: 100, ratio: 0.5 };
const LOAD = { stressMPa: 100, ratio: 0.5, angleDegrees: 90, pressureMPa: 0 };
const HOLE: MapSubject = { kind: 'hole', radiusMm: 8, ...LOAD };
const ELLIPSE: MapSubject = { kind: 'ellipse', halfWidthMm: 8, halfHeightMm: 2, ...LOAD };
const TIP: MapSubject = { kind: 'near-tip', opening: 560, sliding: 0, alongMPa: -50 };
const COMPONENTS: readonly MapComponent[] = ['xx', 'yy', 'xy', 'von Mises', 'first', 'second'];

const request = (more: Partial<MapRequest> = {}): MapRequest => {
  const grid = more.grid ?? {
    leftMm: -20,
    rightMm: 20,
    bottomMm: -10,
    topMm: 10,
    columns: 41,
    rows: 21,
  };
  const cells = grid.columns * grid.rows;
  return {
    subject: CRACK,
    component: 'yy',
    condition: 'plane stress',
    poisson: 0.3,
    cap: 400,
    values: new Float64Array(cells),
    mask: new Uint8Array(cells),
    ...more,
    grid,
  };
};
const filled = (given: MapRequest) => {
  const answer = stressMap(given);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};
const place = (given: MapRequest, x: number, y: number) =>
  Math.round(y - given.grid.bottomMm) * given.grid.columns + Math.round(x - given.grid.leftMm);

describe('a stress map', () => {
  it.each([CRACK, HOLE, ELLIPSE, TIP])('holds only finite numbers: $kind', (subject) => {
    for (const component of COMPONENTS) {
      const given = request({ subject, component });
      const { least, greatest, absent, capped } = filled(given);
      expect(given.values.every((value) => Math.abs(value) <= 400)).toBe(true);
      expect(given.mask.filter((each) => each === MASK.absent)).toHaveLength(absent);
      expect(given.mask.filter((each) => each === MASK.capped)).toHaveLength(capped);
      expect(least).toBeLessThanOrEqual(greatest);
    }
  });

  it('has the values of the field, row by row from the bottom', () => {
    const given = request();
    filled(given);
    const field = westergaardField({ halfLength: mm(10), stress: mpa(100), ratio: 0.5 });
    for (const [x, y] of [
      [-20, -10],
      [20, -10],
      [3, 7],
      [15, 0],
    ] as const)
      expect(given.values[place(given, x, y)]).toBeCloseTo(field(x, y, noStress()).yy, 9);
  });

  it('has principal and equivalent stress of the same state', () => {
    const state = mapFieldOf(HOLE).field(9, 5, noStress());
    const at = (component: MapComponent) => {
      const given = request({ subject: HOLE, component, condition: 'plane strain' });
      filled(given);
      return given.values[place(given, 9, 5)];
    };
    expect(at('first')).toBeCloseTo(firstPrincipal(state), 9);
    expect(at('second')).toBeCloseTo(secondPrincipal(state), 9);
    expect(at('von Mises')).toBeCloseTo(vonMises(state, 'plane strain', 0.3), 9);
    expect(at('xx')).toBeCloseTo(state.xx, 9);
    expect(at('xy')).toBeCloseTo(state.xy, 9);
  });

  it('leaves out the line of the crack and cuts both tips at the cap', () => {
    const given = request();
    expect(filled(given)).toMatchObject({ absent: 19, capped: 2, greatest: 400 });
    expect(given.mask[place(given, 0, 0)]).toBe(MASK.absent);
    expect(given.mask[place(given, 10, 0)]).toBe(MASK.capped);
    expect(given.values[place(given, -10, 0)]).toBe(400);
  });

  it('leaves out the inside of a hole, not its edge', () => {
    const given = request({ subject: HOLE });
    filled(given);
    expect(given.mask[place(given, 7, 0)]).toBe(MASK.absent);
    expect(given.values[place(given, 7, 0)]).toBe(0);
    expect(given.values[place(given, 8, 0)]).toBeCloseTo(250, 9);
    expect(given.values[place(given, 0, 8)]).toBeCloseTo(0, 9);
  });

  it('leaves out the inside of an ellipse, not its edge', () => {
    const given = request({ subject: ELLIPSE, cap: 1000 });
    filled(given);
    expect(given.mask[place(given, 0, 1)]).toBe(MASK.absent);
    expect(given.values[place(given, 8, 0)]).toBeCloseTo(850, 9);
  });

  it('compares the near-tip field with the exact one', () => {
    const given = request({ component: 'near-tip share', cap: 5 });
    filled(given);
    expect(given.values[place(given, 11, 0)]).toBeCloseTo(nearTipShareAhead(0.1), 9);
    expect(given.values[place(given, 20, 0)]).toBeCloseTo(nearTipShareAhead(1), 9);
    expect(given.values.every((value) => Math.abs(value) <= 5)).toBe(true);
  });

  it('keeps the sign of what it cuts', () => {
    const given = request({ subject: HOLE, component: 'second', cap: 20 });
    filled(given);
    expect(Math.min(...given.values)).toBeGreaterThanOrEqual(-20);
    const low = request({ subject: { ...HOLE, stressMPa: -100 }, cap: 20 });
    expect(filled(low).least).toBe(-20);
  });

  it('is nothing when the whole of it lies in the hole', () => {
    const grid = { leftMm: -1, rightMm: 1, bottomMm: -1, topMm: 1, columns: 3, rows: 3 };
    const given = request({ subject: HOLE, grid });
    expect(filled(given)).toEqual({
      status: 'filled',
      least: 0,
      greatest: 0,
      absent: 9,
      capped: 0,
    });
  });

  it('fills single precision too, on any grid', () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 30 }), fc.integer({ min: 2, max: 30 }), (nx, ny) => {
        const grid = { leftMm: -12, rightMm: 9, bottomMm: -5, topMm: 7, columns: nx, rows: ny };
        const values = new Float32Array(nx * ny).fill(Number.NaN);
        filled(request({ grid, values, component: 'von Mises' }));
        expect(values.every((value) => value >= 0 && value <= 400)).toBe(true);
      }),
    );
  });

  it('refills the arrays it is given', () => {
    const given = request({ subject: HOLE });
    filled(given);
    const before = given.values.slice();
    filled({ ...given, subject: CRACK });
    expect(given.values).not.toEqual(before);
    filled(given);
    expect(given.values).toEqual(before);
  });
});

describe('a map is refused', () => {
  const grid = { leftMm: -1, rightMm: 1, bottomMm: -1, topMm: 1, columns: 2, rows: 2 };
  it.each([
    ['a crack pressed shut', { subject: { ...CRACK, stressMPa: -1 } }, 'subject.stressMPa'],
    ['no crack', { subject: { ...CRACK, halfLengthMm: 0 } }, 'subject.halfLengthMm'],
    ['no number', { subject: { ...HOLE, radiusMm: Number.NaN } }, 'subject.radiusMm'],
    ['stress in kPa', { subject: { ...HOLE, stressMPa: 1e5 } }, 'subject.stressMPa'],
    ['edges swapped', { grid: { ...grid, leftMm: 2 } }, 'grid.rightMm'],
    ['no height', { grid: { ...grid, topMm: -1 } }, 'grid.topMm'],
    ['half a column', { grid: { ...grid, columns: 2.5, rows: 4 } }, 'grid.columns'],
    ['one row', { grid: { ...grid, rows: 1 } }, 'grid.rows'],
    ['no cap', { cap: 0 }, 'cap'],
    ['Poisson above a half', { poisson: 0.7 }, 'poisson'],
    ['too short an array', { values: new Float64Array(3) }, 'values.length'],
    ['too long a mask', { mask: new Uint8Array(5000) }, 'mask.length'],
    ['no crack to compare', { subject: HOLE, component: 'near-tip share' }, 'component'],
  ] as const)('for %s', (_, more, path) => {
    const answer = stressMap(request(more));
    expect(answer.status === 'refused' && answer.refusals.map((each) => each.input)).toContain(
      path,
    );
  });
});
