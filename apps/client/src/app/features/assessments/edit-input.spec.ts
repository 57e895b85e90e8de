import { sampleInput } from '@ligament/domain/assessment/testing/sample-input';
import { choose, given, include, setAt, valueAt } from './edit-input';
import { type InputField, inputGroups } from './input-groups';
import { inputDifferences } from './input-differences';
import { givenPaths, isUnexplained, unexplainedPaths } from './overrides';

const shell = sampleInput({ insideDiameter: 2600 });
const fieldsOf = (groups: ReturnType<typeof inputGroups>): readonly InputField[] =>
  groups.flatMap(({ fields }) => fields);

describe('input groups', () => {
  it('hold every value of a shell with its origin exactly once, but for growth', () => {
    const paths = fieldsOf(inputGroups(shell))
      .filter(({ kind }) => kind === 'given')
      .map(({ path }) => path);
    expect(new Set(paths).size).toBe(paths.length);
    expect([...paths].sort()).toEqual([...givenPaths(shell)].sort());
  });

  it('ask for the ligament of an embedded flaw only', () => {
    const asks = (input: typeof shell) =>
      fieldsOf(inputGroups(input)).some(({ path }) => path === 'flaw.ligamentMm');
    expect(asks(shell)).toBe(false);
    expect(asks(sampleInput({ kind: 'embedded', ligament: 6 }))).toBe(true);
  });

  it('ask for the diameter of a cylinder, and let a plate have a width', () => {
    expect(fieldsOf(inputGroups(shell))).toContainEqual({
      kind: 'given',
      path: 'wall.insideDiameterMm',
    });
    expect(fieldsOf(inputGroups(sampleInput())).map(({ path }) => path)).toContain('wall.widthMm');
  });
});

describe('editing an input', () => {
  it('changes one member and leaves the rest and the original alone', () => {
    const after = setAt(shell, 'material.yieldMPa', {
      value: 285,
      provenance: 'certificate',
      note: 'B8830',
    });
    expect(after.material.yieldMPa.value).toBe(285);
    expect(after.material.tensileMPa).toBe(shell.material.tensileMPa);
    expect(shell.material.yieldMPa.value).toBe(350);
  });

  it('changes a member of a list', () => {
    const after = setAt(shell, 'growth.fatigue.blocks.0.cyclesPerYear', 12);
    expect(valueAt(after, 'growth.fatigue.blocks.0.cyclesPerYear')).toBe(12);
    expect(valueAt(after, 'growth.fatigue.blocks.0.note')).toBe('start and stop');
  });

  it('leaves empty what the other case needs and the register does not know', () => {
    const embedded = choose(shell, 'flaw.kind', 'embedded', null);
    expect(embedded.flaw.kind).toBe('embedded');
    expect(embedded.flaw.ligamentMm?.value).toBeNaN();
    expect(choose(embedded, 'flaw.kind', 'surface', null).flaw.ligamentMm).toBeNull();
  });

  it('takes the diameter of the register when a plate becomes a cylinder again', () => {
    const plate = choose(shell, 'wall.shape', 'plate', shell);
    expect(plate.wall).toMatchObject({ shape: 'plate', widthMm: null });
    expect(choose(plate, 'wall.shape', 'cylinder', shell).wall).toMatchObject({
      insideDiameterMm: { value: 2600 },
    });
  });

  it('gives each body its own members, and a flaw that it can hold', () => {
    const hole = choose(shell, 'wall.shape', 'hole edge', null);
    expect(hole.wall).toMatchObject({ shape: 'hole edge', widthMm: null, flawedSides: 'one' });
    expect(hole.flaw.kind).toBe('through-wall');
    const corner = choose(hole, 'flaw.kind', 'corner', null);
    expect(choose(corner, 'wall.shape', 'nozzle corner', null).flaw.kind).toBe('corner');
    expect(choose(shell, 'wall.shape', 'sphere', null).wall).toMatchObject({
      shape: 'sphere',
      insideDiameterMm: { value: 2600 },
    });
    expect(choose(shell, 'wall.shape', 'round bar', null).flaw.kind).toBe('extended surface');
  });

  it('takes an attachment out with its weld toe', () => {
    const path = 'stress.weldToe.attachmentLengthMm';
    const on = include(shell, path, true, null);
    expect(given(valueAt(on, path))?.value).toBeNaN();
    expect(include(on, path, false, null).stress.weldToe).toBeNull();
  });

  it('gives each residual stress its own members', () => {
    const residual = (state: string) =>
      choose(shell, 'stress.residual.state', state, null).stress.residual;
    expect(residual('as-welded')).toEqual({ state: 'as-welded' });
    expect(residual('heat-treated')).toEqual({ state: 'heat-treated', flawToWeld: 'parallel' });
    expect(Object.keys(residual('entered'))).toEqual(['state', 'membraneMPa', 'bendingMPa']);
    expect(residual('none')).toEqual({ state: 'none' });
  });

  it('puts in and takes out what may be left out', () => {
    const path = 'stress.crackFacePressureMPa';
    const known = sampleInput({ insideDiameter: 2600, facePressure: 2.3 });
    expect(include(shell, path, true, known).stress.crackFacePressureMPa?.value).toBe(2.3);
    expect(include(known, path, false, known).stress.crackFacePressureMPa).toBeNull();
  });
});

describe('a value put over the register’s', () => {
  const register = { value: 3, provenance: 'measured' as const, note: 'Report T-1' };

  it('needs its own note', () => {
    expect(isUnexplained({ ...register, value: 4 }, register)).toBe(true);
    expect(isUnexplained({ ...register, value: 4, note: ' ' }, register)).toBe(true);
    expect(isUnexplained({ ...register, value: 4, note: 'Scanned again' }, register)).toBe(false);
    expect(isUnexplained(register, register)).toBe(false);
    expect(isUnexplained({ ...register, value: 4 }, null)).toBe(false);
  });

  it('is found wherever it is', () => {
    const changed = setAt(shell, 'wall.thicknessMm', { ...shell.wall.thicknessMm, value: 24 });
    expect(unexplainedPaths(changed, shell)).toEqual(['wall.thicknessMm']);
    expect(unexplainedPaths(changed, null)).toEqual([]);
  });
});

describe('differences between two inputs', () => {
  it('name value, origin and note before and after', () => {
    const after = setAt(shell, 'material.toughnessMPaSqrtM', {
      value: 60,
      provenance: 'certificate',
      note: 'B8830',
    });
    expect(inputDifferences(shell, after)).toEqual([
      {
        name: 'Fracture toughness',
        unit: 'MPa√m',
        before: '80 (measured: test)',
        after: '60 (certificate: B8830)',
      },
    ]);
  });

  it('show what is new and what is gone', () => {
    const after = choose(shell, 'stress.residual.state', 'heat-treated', null);
    expect(inputDifferences(shell, after)).toEqual([
      { name: 'Residual stress taken as', unit: '', before: 'none', after: 'heat-treated' },
      { name: 'Flaw against the weld', unit: '', before: 'not given', after: 'parallel' },
    ]);
  });

  it('are none between equal inputs', () => {
    expect(inputDifferences(shell, sampleInput({ insideDiameter: 2600 }))).toEqual([]);
    expect(given(shell.horizonYears)).toBeNull();
  });
});
