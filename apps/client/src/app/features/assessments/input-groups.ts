import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { FACES, FLAW_KINDS, ORIENTATIONS } from '@ligament/domain/contract/vocabulary';

/** One thing to fill in: a value with its origin, a word to choose, a yes or no, or a value that may be left out. */
export type InputField =
  | { readonly kind: 'given'; readonly path: string }
  | { readonly kind: 'optional'; readonly path: string; readonly label: string }
  | { readonly kind: 'choice'; readonly path: string; readonly options: readonly Option[] }
  | { readonly kind: 'flag'; readonly path: string; readonly label: string };

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
  { value: 'plate', words: 'plate (flat wall, sphere or head)' },
];
const RESIDUALS: readonly Option[] = [
  { value: 'as-welded', words: 'as welded: yield magnitude' },
  { value: 'heat-treated', words: 'post-weld heat treated, with the chart' },
  { value: 'entered', words: 'entered values' },
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
        given('stress.primaryMembraneMPa'),
        given('stress.primaryBendingMPa'),
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

const wall = ({ wall: { shape } }: AssessmentInput): InputGroup => ({
  title: 'Wall',
  hint: 'Where the flaw is; measured thickness before nominal.',
  fields: [
    choice('wall.shape', SHAPES),
    given('wall.thicknessMm'),
    shape === 'cylinder'
      ? given('wall.insideDiameterMm')
      : { kind: 'optional', path: 'wall.widthMm', label: 'Width of the plate matters' },
  ],
});

const flaw = ({ flaw: { kind } }: AssessmentInput): InputGroup => ({
  title: 'Flaw',
  hint: 'As measured, before any allowance. The through-wall extent is what counts most.',
  fields: [
    choice('flaw.kind', same(FLAW_KINDS)),
    choice('flaw.face', same(FACES)),
    choice('flaw.orientation', same(ORIENTATIONS)),
    given('flaw.heightMm'),
    given('flaw.lengthMm'),
    ...(kind === 'embedded' ? [given('flaw.ligamentMm')] : []),
  ],
});

function residual({ stress }: AssessmentInput): InputGroup {
  const more: Partial<Record<typeof stress.residual.state, readonly InputField[]>> = {
    entered: [given('stress.residual.membraneMPa'), given('stress.residual.bendingMPa')],
    'heat-treated': [choice('stress.residual.flawToWeld', TO_WELD)],
  };
  return {
    title: 'Residual stress',
    hint: 'Heat treatment counts only with its chart; without it the weld is taken as welded.',
    fields: [choice('stress.residual.state', RESIDUALS), ...(more[stress.residual.state] ?? [])],
  };
}
