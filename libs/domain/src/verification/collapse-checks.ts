import { cornerReference } from '../fracture/reference-stress/corner-reference';
import { axialThroughWallApiReference } from '../fracture/reference-stress/cylinder-through-wall-reference';
import {
  freeLigament,
  heldLigament,
} from '../fracture/reference-stress/extended-surface-reference';
import { linePipeBulging, linePipeFailure } from '../fracture/reference-stress/line-pipe-failure';
import {
  pipeCollapseBending,
  pipeCollapseReference,
} from '../fracture/reference-stress/pipe-collapse';
import {
  bendingRelief,
  plateSurfaceApiReference,
} from '../fracture/reference-stress/plate-surface-api-reference';
import { plateThroughWallReference } from '../fracture/reference-stress/plate-through-wall-reference';
import { soundWall } from '../fracture/reference-stress/sound-wall';
import { mpa } from '../units/quantity';
import type { CheckKind, CheckRow } from './check-row';
import { crackOf } from './crack-of';

const BS = 'BS 7910 Annex P (from memory; form seen in a secondary source)';
const API = 'API 579-1 Annex 9C (from memory; equations seen in a secondary source)';
const BLOCKS = 'independent limit analysis: stress blocks in equilibrium';
const PIPE = 'ASME XI Appendix C form (from memory), held against equilibrium by integration';
const WHOLE = 'the whole case computed with a separate program, two methods each';

const CORNER = crackOf({ a: 5, c: 15, t: 20, W: 500 });
const through = (c: number, W: number) => crackOf({ a: 20, c, t: 20, W });
const FORTY = (40 * Math.PI) / 180;

const ROWS: readonly (readonly [
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
])[] = [
  [
    'crack through a plate, vanishing, membrane',
    100,
    'MPa',
    1e-8,
    'exact limit',
    'Pm of the sound plate',
    () => plateThroughWallReference(through(1e-9, 200), mpa(100), mpa(0)),
  ],
  [
    'crack through a plate, vanishing, bending 150 MPa',
    100,
    'MPa',
    1e-8,
    'exact limit',
    'Pb/1.5',
    () => plateThroughWallReference(through(1e-9, 200), mpa(0), mpa(150)),
  ],
  [
    'sound wall, 100 + 100 MPa',
    138.7425886722793,
    'MPa',
    1e-9,
    'closed form',
    '[Pb + √(Pb² + 9 Pm²)]/3',
    () => soundWall(mpa(100), mpa(100)),
  ],
  [
    'sound wall, by M/Mp + (N/Np)² = 1',
    138.7425886781725,
    'MPa',
    1e-9,
    'independent computation',
    'limit analysis',
    () => soundWall(mpa(100), mpa(100)),
  ],
  [
    'crack through a plate, 2c 40 in 200 mm',
    125,
    'MPa',
    1e-9,
    'from memory',
    BS,
    () => plateThroughWallReference(through(20, 200), mpa(100), mpa(0)),
  ],
  [
    'ligament free to bend, a/t 0.4, 100 + 50 MPa',
    386.6558963999728,
    'MPa',
    1e-9,
    'independent computation',
    BLOCKS,
    () => freeLigament(0.4, mpa(100), mpa(50)),
  ],
  [
    'ligament held, a/t 0.4, membrane',
    166.6666666666667,
    'MPa',
    1e-9,
    'closed form',
    'Pm/(1 − a/t)',
    () => heldLigament(0.4, mpa(100), mpa(0)),
  ],
  [
    'ligament held, a/t 0.4, bending 90 MPa',
    166.6666666666667,
    'MPa',
    1e-9,
    'closed form',
    '2 Pb/[3 (1 − a/t)²]',
    () => heldLigament(0.4, mpa(0), mpa(90)),
  ],
  [
    'corner flaw 5 × 15 in 20 mm',
    107.3170731707317,
    'MPa',
    1e-9,
    'from memory',
    BS,
    () => cornerReference(CORNER, mpa(100), mpa(0)),
  ],
  [
    'relief of bending g, a 5, c 15, t 20',
    0.9935833813681397,
    '',
    1e-9,
    'from memory',
    API,
    () => bendingRelief(CORNER),
  ],
  [
    'surface flaw in a plate, API form',
    171.6845492657816,
    'MPa',
    1e-9,
    'from memory',
    API,
    () => plateSurfaceApiReference(CORNER, mpa(120), mpa(80)),
  ],
  [
    'axial flaw through a cylinder, API form',
    213.2065323379612,
    'MPa',
    1e-9,
    'from memory',
    API,
    () => axialThroughWallApiReference(crackOf({ a: 25, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)),
  ],
  [
    'bulging of a line pipe at z = 1',
    1.274411628948826,
    '',
    1e-9,
    'from memory',
    'modified B31G (from memory)',
    () => linePipeBulging(1),
  ],
  [
    'bulging of a line pipe just below z = 50',
    4.9,
    '',
    0.002,
    'from memory',
    'modified B31G (from memory): where the branches meet',
    () => linePipeBulging(50),
  ],
  [
    'failure of a line pipe without bulging',
    400,
    'MPa',
    1e-9,
    'exact limit',
    'flow stress',
    () => linePipeFailure(400, 0.3, 1),
  ],
  [
    'pipe without a crack, bending at collapse',
    381.9718634205488,
    'MPa',
    1e-9,
    'closed form',
    '4 σf/π',
    () => pipeCollapseBending({ halfAngle: 0, depth: 0 }, 0, 300),
  ],
  [
    'pipe, θ 45°, a/t 0.5, Pm 30: bending at collapse',
    290.8389691155424,
    'MPa',
    2e-4,
    'independent computation',
    PIPE,
    () => pipeCollapseBending({ halfAngle: 0.785398163397, depth: 0.5 }, 30, 300),
  ],
  [
    'pipe, θ 30°, through the wall, Pm 40: bending at collapse',
    244.8464565089599,
    'MPa',
    2e-4,
    'independent computation',
    PIPE,
    () => pipeCollapseBending({ halfAngle: 0.523598775598, depth: 1 }, 40, 300),
  ],
  [
    'plate W 400, 2c 30: load ratio',
    0.4633204633204633,
    '',
    1e-9,
    'independent computation',
    WHOLE,
    () => plateThroughWallReference(through(15, 400), mpa(150), mpa(0)) / 350,
  ],
  [
    'pipe, 40° and a/t 4/15: load factor to collapse',
    2.271843322811473,
    '',
    1e-6,
    'independent computation',
    WHOLE,
    () => 375 / pipeCollapseReference({ halfAngle: FORTY, depth: 4 / 15 }, 80, 120),
  ],
];

export const COLLAPSE_CHECKS: readonly CheckRow[] = ROWS.map(
  ([quantity, published, unit, tolerance, kind, source, compute], i) => ({
    id: `RC-${i + 1}`,
    group: 'Reference stress',
    quantity,
    published,
    unit,
    tolerance,
    kind,
    source,
    compute,
  }),
);
