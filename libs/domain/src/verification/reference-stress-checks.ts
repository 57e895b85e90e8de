import { bulgingFactor } from '../fracture/reference-stress/bulging-factor';
import {
  cylinderAxialApiReference,
  surfaceBulgingFactor,
} from '../fracture/reference-stress/cylinder-axial-api-reference';
import { cylinderAxialReference } from '../fracture/reference-stress/cylinder-axial-reference';
import { cylinderCircumferentialReference } from '../fracture/reference-stress/cylinder-circumferential-reference';
import { plateEmbeddedReference } from '../fracture/reference-stress/plate-embedded-reference';
import {
  plateSurfaceReference,
  plateSurfaceReferencePinned,
  surfaceAreaRatio,
} from '../fracture/reference-stress/plate-surface-reference';
import { mpa } from '../units/quantity';
import type { CheckKind, CheckRow } from './check-row';
import { crackOf, type CrackSymbols } from './crack-of';

const BS = 'BS 7910 Annex P (from memory; form seen in secondary sources)';
const API = 'API 579-1 Annex 9C (seen in a secondary source that cites the equations)';
const EQUILIBRIUM = 'independent limit analysis: stress blocks in equilibrium';

const row = (
  id: string,
  quantity: string,
  published: number,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
  unit = 'MPa',
): CheckRow => ({
  id,
  group: 'Reference stress',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

type Formula = typeof plateSurfaceReference;
const at = (formula: Formula, crack: CrackSymbols, pm: number, pb: number) => () =>
  formula(crackOf(crack), mpa(pm), mpa(pb));

const SURFACE = { a: 5, c: 15, t: 20, W: 500 };
const LONG = { a: 8, c: 1e12, t: 20, W: Infinity };
const TINY = { a: 1e-9, c: 15, t: 20, W: 500 };
const EMBEDDED = { a: 3, c: 10, t: 25, W: 500, p: 4 };
const PIPE = { a: 8, c: 40, t: 25, Ri: 750 };

export const REFERENCE_STRESS_CHECKS: readonly CheckRow[] = [
  row(
    'RS-1',
    'no flaw, membrane only: Pm',
    100,
    1e-8,
    'exact limit',
    'limit',
    at(plateSurfaceReference, TINY, 100, 0),
  ),
  row(
    'RS-2',
    'no flaw, bending only: Pb/1.5',
    100,
    1e-8,
    'exact limit',
    'plastic section modulus',
    at(plateSurfaceReference, TINY, 0, 150),
  ),
  row(
    'RS-3',
    'no flaw, combined',
    138.7425886781725,
    1e-8,
    'independent computation',
    'M/Mp + (N/Np)² = 1',
    at(plateSurfaceReference, TINY, 100, 100),
  ),
  row(
    'RS-4',
    'surface flaw, held wall, membrane',
    112,
    1e-9,
    'from memory',
    BS,
    at(plateSurfaceReference, SURFACE, 100, 0),
  ),
  row(
    'RS-5',
    'surface flaw, free to bend, membrane',
    126.243517675647,
    1e-9,
    'from memory',
    BS,
    at(plateSurfaceReferencePinned, SURFACE, 100, 0),
  ),
  row(
    'RS-6',
    'surface flaw, held wall, combined',
    171.9508728053019,
    1e-9,
    'from memory',
    BS,
    at(plateSurfaceReference, SURFACE, 120, 80),
  ),
  row(
    'RS-7',
    'area ratio in a narrow plate',
    0.125,
    1e-9,
    'from memory',
    BS,
    () => surfaceAreaRatio(crackOf({ ...SURFACE, W: 60 })),
    '',
  ),
  row(
    'RS-8',
    'both area ratios at W = 2 (c + B)',
    0.1071428571428571,
    1e-9,
    'exact limit',
    'continuity',
    () => surfaceAreaRatio(crackOf({ ...SURFACE, W: 70 })),
    '',
  ),
  row(
    'RS-9',
    'very long flaw, free to bend',
    386.6558963999728,
    1e-9,
    'independent computation',
    EQUILIBRIUM,
    at(plateSurfaceReferencePinned, LONG, 100, 50),
  ),
  row(
    'RS-10',
    'very long flaw, held wall, membrane',
    166.6666666666667,
    1e-9,
    'closed form',
    'Pm/(1 − a/B)',
    at(plateSurfaceReference, LONG, 100, 0),
  ),
  row(
    'RS-11',
    'very long flaw, held wall, bending',
    166.6666666666667,
    1e-9,
    'closed form',
    '2 Pb/[3 (1 − a/B)²]',
    at(plateSurfaceReference, LONG, 0, 90),
  ),
  row(
    'RS-12',
    'embedded flaw',
    151.5581130856026,
    1e-9,
    'from memory',
    BS,
    at(plateEmbeddedReference, EMBEDDED, 120, 40),
  ),
  row(
    'RS-13',
    'embedded flaw, vanishing',
    134.0718018418322,
    1e-7,
    'exact limit',
    'limit',
    at(plateEmbeddedReference, { ...EMBEDDED, a: 1e-9 }, 120, 40),
  ),
  row(
    'RS-14',
    'embedded flaw without ligament = surface flaw of depth 2a',
    156.0632398496809,
    1e-9,
    'exact limit',
    'consistency',
    at(plateEmbeddedReference, { ...EMBEDDED, p: 0 }, 120, 40),
  ),
  row(
    'RS-15',
    'very long embedded flaw',
    209.3257304344959,
    1e-6,
    'independent computation',
    `${EQUILIBRIUM} of two ligaments`,
    at(plateEmbeddedReference, { ...EMBEDDED, c: 1e9, W: 1e12 }, 120, 40),
  ),
  row(
    'RS-16',
    'bulging factor of a through-wall crack',
    1.300691117733725,
    1e-9,
    'from memory',
    API,
    () => bulgingFactor(1.285520128),
    '',
  ),
  row(
    'RS-17',
    'the same without a crack: not 1',
    1.009950493836208,
    1e-9,
    'closed form',
    'limit of the fit',
    () => bulgingFactor(0),
    '',
  ),
  row(
    'RS-18',
    'surface bulging factor',
    1.050124619070624,
    1e-9,
    'from memory',
    API,
    () => surfaceBulgingFactor(crackOf(PIPE)),
    '',
  ),
  row(
    'RS-19',
    'axial surface flaw, API form, membrane only',
    210.0249238141248,
    1e-9,
    'closed form',
    'Ms Pm',
    at(cylinderAxialApiReference, PIPE, 200, 0),
  ),
  row(
    'RS-20',
    'axial surface flaw, BS form, vanishing: 1.2 Pm',
    240,
    1e-5,
    'from memory',
    BS,
    at(cylinderAxialReference, { ...PIPE, a: 1e-6 }, 200, 0),
  ),
  row(
    'RS-21',
    'circumferential surface flaw, vanishing: Pm + 2 Pb/3',
    140,
    1e-7,
    'from memory',
    BS,
    at(cylinderCircumferentialReference, { ...PIPE, a: 1e-9 }, 100, 60),
  ),
];
