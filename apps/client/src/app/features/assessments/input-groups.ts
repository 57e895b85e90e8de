import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { FACES, ORIENTATIONS } from '@ligament/domain/contract/vocabulary';
import { hasHeight, hasLength, KINDS_OF_WALL } from '@ligament/domain/geometry/flaw-kind';

/** One thing to fill in: a value with its origin, a word to choose, a yes or no, or a value that may be left out. */
export type InputField =
  | { readonly kind: 'given'; readonly path: string }
  | { readonly kind: 'optional'; readonly path: string; readonly label: string }
  | { readonly kind: 'choice'; readonly path: string; readonly options: readonly Option[] }
  | { readonly kind: 'flag'; readonly path: string; readonly label: string }
  /** Coefficients of a polynomial through the wall; with a label it may be left out. */
  | { readonly kind: 'profile'; readonly path: string; readonly label: string };

export interface Option {
  readonly value: string;
  readonly words: string;
}

export interface InputGroup {
  readonly title: string;
  readonly hint: string;
  readonly fields: readonly InputField[];
}

const same = (words: readonly string[]): Option[] =>
  words.map((value) => ({ value, words: value }));
const given = (path: string): InputField => ({ kind: 'given', path });
const choice = (path: string, options: readonly Option[]): InputField => ({
  kind: 'choice',
  path,
  options,
});

const SHAPES: readonly Option[] = [
  { value: 'cylinder', words: 'cylinder' },
  { value: 'sphere', words: 'sphere' },
  { value: 'plate', words: 'plate (flat wall, or head)' },
  { value: 'hole edge', words: 'edge of a hole' },
  { value: 'nozzle corner', words: 'corner of a nozzle or of a narrow hole' },
  { value: 'round bar', words: 'round bar' },
];
const SIDES: readonly Option[] = [
  { value: 'one', words: 'on one side of the hole' },
  { value: 'both', words: 'on both sides of the hole' },
];
const RESIDUALS: readonly Option[] = [
  { value: 'as-welded', words: 'as welded: yield magnitude' },
  { value: 'heat-treated', words: 'post-weld heat treated, with the chart' },
  { value: 'proof-tested', words: 'as welded, relaxed by a proof test' },
  { value: 'entered', words: 'entered values' },
  { value: 'profile', words: 'entered as a polynomial' },
  { value: 'none', words: 'none' },
];
const TO_WELD: readonly Option[] = [
  { value: 'parallel', words: 'parallel to the weld' },
  { value: 'transverse', words: 'transverse to the weld' },
];

/** The inputs of a case in the order an engineer goes through them; growth has its own form. */
export function inputGroups(input: AssessmentInput): readonly InputGroup[] {
  return [
    wall(input),
    flaw(input),
    {
      title: 'Sizing',
      hint: 'Added to the measured size before anything is computed.',
      fields: [given('sizing.heightAllowanceMm'), given('sizing.lengthAllowanceMm')],
    },
    {
      title: 'Primary stress',
      hint: 'Normal to the flaw at the governing load; bending positive when it opens the flawed face.',
      fields: [
        ...(input.stress.primaryProfileMPa
          ? []
          : [given('stress.primaryMembraneMPa'), given('stress.primaryBendingMPa')]),
        ...(input.wall.shape === 'nozzle corner'
          ? [
              {
                kind: 'profile' as const,
                path: 'stress.peakProfileMPa',
                label: 'Stress across the corner, concentration included',
              },
            ]
          : []),
        {
          kind: 'profile',
          path: 'stress.primaryProfileMPa',
          label: 'Entered as a polynomial through the wall',
        },
        { kind: 'optional', path: 'stress.offsetMm', label: 'Walls are offset at the weld' },
        {
          kind: 'optional',
          path: 'stress.weldToe.attachmentLengthMm',
          label: 'Starts from the toe of an attachment',
        },
        {
          kind: 'optional',
          path: 'stress.crackFacePressureMPa',
          label: 'Pressure reaches the crack faces',
        },
      ],
    },
    residual(input),
    {
      title: 'Material',
      hint: 'At the governing temperature; toughness at the lowest metal temperature under load.',
      fields: [
        given('material.yieldMPa'),
        given('material.tensileMPa'),
        given('material.toughnessMPaSqrtM'),
        given('material.youngsModulusMPa'),
        given('material.poissonsRatio'),
        { kind: 'flag', path: 'material.yieldPlateau', label: 'Yields with a plateau' },
      ],
    },
  ];
}

const WIDTH: InputField = {
  kind: 'optional',
  path: 'wall.widthMm',
  label: 'Width of the plate matters',
};
const HOLE = given('wall.holeRadiusMm');

/** What a body needs beside its thickness. */
const OF_SHAPE: Readonly<Record<AssessmentInput['wall']['shape'], readonly InputField[]>> = {
  plate: [WIDTH],
  cylinder: [given('wall.insideDiameterMm')],
  sphere: [given('wall.insideDiameterMm')],
  'hole edge': [HOLE, choice('wall.flawedSides', SIDES), WIDTH],
  'nozzle corner': [HOLE],
  'round bar': [],
};

const wall = ({ wall: { shape } }: AssessmentInput): InputGroup => ({
  title: 'Wall',
  hint: 'Where the flaw is; measured thickness before nominal.',
  fields: [choice('wall.shape', SHAPES), given('wall.thicknessMm'), ...OF_SHAPE[shape]],
});

const flaw = ({ flaw: { kind }, wall: { shape } }: AssessmentInput): InputGroup => ({
  title: 'Flaw',
  hint: 'As measured, before any allowance. The through-wall extent is what counts most.',
  fields: [
    choice('flaw.kind', same(KINDS_OF_WALL[shape])),
    choice('flaw.face', same(FACES)),
    choice('flaw.orientation', same(ORIENTATIONS)),
    ...(hasHeight(kind) ? [given('flaw.heightMm')] : []),
    ...(hasLength(kind) ? [given('flaw.lengthMm')] : []),
    ...(kind === 'embedded' ? [given('flaw.ligamentMm')] : []),
  ],
});

function residual({ stress }: AssessmentInput): InputGroup {
  const more: Partial<Record<typeof stress.residual.state, readonly InputField[]>> = {
    entered: [given('stress.residual.membraneMPa'), given('stress.residual.bendingMPa')],
    'proof-tested': [given('stress.residual.membraneMPa'), given('stress.residual.bendingMPa')],
    profile: [{ kind: 'profile', path: 'stress.residual.profileMPa', label: '' }],
    'heat-treated': [choice('stress.residual.flawToWeld', TO_WELD)],
  };
  return {
    title: 'Residual stress',
    hint: 'Heat treatment counts only with its chart; without it the weld is taken as welded.',
    fields: [choice('stress.residual.state', RESIDUALS), ...(more[stress.residual.state] ?? [])],
  };
}
