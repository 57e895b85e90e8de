import { CATALOGUE } from '../fracture/catalogue';
import { solutionsFor } from '../fracture/select-solutions';
import { FLAW_KINDS, KINDS_OF_WALL, WALL_SHAPES, type FlawKind } from '../geometry/flaw-kind';
import { assessFlaw } from './assess-flaw';
import { leakOfFlaw } from './analyses/leak-of-flaw';
import type { AssessmentInput, WallInput } from './assessment-input';
import type { AssessedFlaw } from './assessment-outcome';
import { situationOf } from './flaw-case';
import { given, sampleInput } from './testing/sample-input';

const WALLS: Readonly<Record<WallInput['shape'], WallInput>> = {
  plate: { shape: 'plate', thicknessMm: given(20), widthMm: given(600) },
  cylinder: { shape: 'cylinder', thicknessMm: given(20), insideDiameterMm: given(500) },
  sphere: { shape: 'sphere', thicknessMm: given(20), insideDiameterMm: given(3000) },
  'hole edge': {
    shape: 'hole edge',
    thicknessMm: given(20),
    holeRadiusMm: given(20),
    widthMm: given(600),
    flawedSides: 'one',
  },
  'nozzle corner': { shape: 'nozzle corner', thicknessMm: given(20), holeRadiusMm: given(60) },
  'round bar': { shape: 'round bar', thicknessMm: given(60) },
};

function caseOf(wall: WallInput, kind: FlawKind): AssessmentInput {
  const input = sampleInput({ membrane: 60, toughness: 100, allowance: 0, lengthAllowance: 0 });
  const length = kind === 'corner' ? 5 : 12;
  return {
    ...input,
    wall,
    flaw: {
      ...input.flaw,
      kind,
      orientation: kind === 'through-wall' ? 'axial' : 'circumferential',
      heightMm: given(kind === 'embedded' ? 6 : 4),
      lengthMm: given(wall.shape === 'round bar' ? 6 : length),
      ligamentMm: kind === 'embedded' ? given(wall.shape === 'round bar' ? 27 : 7) : null,
    },
  };
}

function assessed(input: AssessmentInput): AssessedFlaw {
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

const PAIRS = WALL_SHAPES.flatMap((shape) =>
  KINDS_OF_WALL[shape].map((kind) => [shape, kind] as const),
);

describe.each(PAIRS)('in a %s a flaw of kind %s', (shape, kind) => {
  const input = caseOf(WALLS[shape], kind);
  const flaw = assessed(input);

  it('gets a verdict by solutions that are named', () => {
    const entry = solutionsFor(situationOf(input));
    expect(flaw.solution.stressIntensity).toBe(entry?.stressIntensity[0].title);
    expect(flaw.solution.referenceStress).toBe(entry?.referenceStress[0].title);
    expect(flaw.kPrimaryMPaSqrtM).toBeGreaterThan(0);
    expect(flaw.reserveOnLoad).toBeGreaterThan(1);
  });

  it('grows to an end that has a reason', () => {
    const [first, ...rest] = flaw.path;
    const last = rest[rest.length - 1];
    expect(['limit reached', 'through-wall', 'outside validity', 'horizon', 'no growth']).toContain(
      flaw.life.end,
    );
    expect((last?.heightMm ?? 0) + (last?.lengthMm ?? 0)).toBeGreaterThanOrEqual(
      (first?.heightMm ?? 0) + (first?.lengthMm ?? 0),
    );
  });

  it('has a limiting size in the extent that can grow', () => {
    if (kind === 'through-wall' || kind === 'edge') {
      expect(flaw.limitingHeightMm).toBeNull();
      expect(flaw.limitingLengthMm).toBeGreaterThan(input.flaw.lengthMm.value);
    } else {
      expect(flaw.limitingHeightMm).toBeGreaterThan(input.flaw.heightMm.value);
      expect(flaw.limitingLengthMm).toBeNull();
    }
  });

  it('is nearer to the line under more load', () => {
    const more = assessed({
      ...input,
      stress: { ...input.stress, primaryMembraneMPa: given(70) },
    });
    expect(more.reserveOnLoad).toBeLessThan(flaw.reserveOnLoad);
  });

  it('gets a verdict under a stress polynomial too, never below the same stress as a straight line', () => {
    const withProfile = (value: readonly number[]) =>
      assessed({
        ...input,
        stress: {
          ...input.stress,
          primaryProfileMPa: { value, provenance: 'measured', note: 'test' },
        },
      });
    expect(withProfile([60]).kr).toBeCloseTo(flaw.kr, 12);
    expect(withProfile([60, 0, 10]).kr).toBeGreaterThanOrEqual(flaw.kr - 1e-12);
  });
});

describe('the catalogue', () => {
  it('has an entry for every flaw a body can hold, and none besides', () => {
    const asked = WALL_SHAPES.flatMap((shape) =>
      FLAW_KINDS.flatMap((kind) =>
        (['inside', 'outside'] as const).flatMap((face) =>
          (['axial', 'circumferential'] as const).flatMap((orientation) =>
            (['one', 'both'] as const).map((flawedSides) => ({
              shape,
              kind,
              face,
              orientation,
              flawedSides,
            })),
          ),
        ),
      ),
    );
    const found = new Set<unknown>();
    for (const situation of asked) {
      const entry = solutionsFor(situation);
      expect(entry !== undefined).toBe(KINDS_OF_WALL[situation.shape].includes(situation.kind));
      if (entry) found.add(entry);
    }
    expect(found.size).toBe(Object.keys(CATALOGUE).length);
  });
});

describe('a solution chosen by hand', () => {
  const shell = caseOf(WALLS.cylinder, 'surface');
  const axial: AssessmentInput = { ...shell, flaw: { ...shell.flaw, orientation: 'axial' } };
  const reason = 'checked against a shell analysis';

  it('takes the place of the one that governs', () => {
    const other = assessed({
      ...axial,
      referenceStressChoice: { key: 'cylinder-axial-api', reason },
    });
    expect(other.lr).toBeLessThan(assessed(axial).lr);
    expect(other.solution.referenceStress).toMatch(/second form/);
  });

  it('that is not for this flaw is refused by name', () => {
    const outcome = assessFlaw({
      ...axial,
      stressIntensityChoice: { key: 'plate-corner', reason },
    });
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'stressIntensityChoice.key', value: 'plate-corner' }],
    });
  });
});

describe('the toe of a weld', () => {
  it('raises K of a shallow flaw and says so', () => {
    const plain = caseOf(WALLS.plate, 'surface');
    const toe = {
      ...plain,
      stress: { ...plain.stress, weldToe: { attachmentLengthMm: given(30) } },
    };
    expect(assessed(toe).kr).toBeGreaterThan(assessed(plain).kr);
    expect(assessed(toe).solution.stressIntensity).toMatch(/toe of a weld/);
  });
});

describe('leak before break', () => {
  const statements = {
    'leak watched': true,
    'no sudden load': true,
    'no long cracking': true,
    'no brittle state': true,
    'leak harmless': true,
  } as const;
  const ask = (wall: WallInput, kind: FlawKind = 'surface', leakingLengthMm: number | null = 20) =>
    leakOfFlaw(caseOf(wall, kind), { leakingLengthMm, factorOnLength: 2, statements });

  it('is shown for a short flaw in a tough shell when every condition is met', () => {
    const found = ask(WALLS.plate);
    expect(found).toMatchObject({ status: 'answered', answer: 'shown' });
    if (found.status === 'answered') {
      expect(found.criticalLengthMm).toBeGreaterThan(4 * found.breakthroughHalfLengthMm);
    }
  });

  it('is not shown while nobody knows which leak is noticed', () => {
    expect(ask(WALLS.plate, 'surface', null)).toMatchObject({ answer: 'not shown' });
  });

  it('is not asked of a body without a through-wall solution', () => {
    expect(ask(WALLS['round bar'], 'extended surface')).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'wall.shape' }],
    });
  });
});
