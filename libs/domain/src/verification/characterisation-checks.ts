import { boundingArea, boundingRectangle } from '../geometry/characterisation/bounding';
import { SURFACE_RULES, THROUGH_RULES } from '../geometry/characterisation/category-rules';
import { interactionRule, type PlacedFlaw } from '../geometry/characterisation/interaction-rules';
import { combined, interacts } from '../geometry/characterisation/interacts';
import { principalDirection, projectedLength } from '../geometry/characterisation/projection';
import { sizedUp } from '../geometry/characterisation/sized-up';
import type { CheckKind, CheckRow } from './check-row';

const POINTS = [
  [0, 3],
  [4, 6.5],
  [9, 8],
  [15, 5],
  [18, 3.5],
].map(([alongMm = 0, depthMm = 0]) => ({ alongMm, depthMm }));

/** A surface flaw whose near end lies at a place [mm]. */
const surface = (a: number, c: number, from: number): PlacedFlaw => ({
  name: `${a}`,
  kind: 'surface',
  a,
  c,
  ligamentMm: 0,
  positionMm: from + c,
  planeMm: 0,
});
const embedded = (a: number, ligamentMm: number): PlacedFlaw => ({
  ...surface(a, 10, 0),
  kind: 'embedded',
  ligamentMm,
});

const [SHALLOW, DEEPER] = [surface(3, 6, 0), surface(4, 8, 14)];
const [asme, api] = SURFACE_RULES;
const [through] = THROUGH_RULES;
const along = (key: string) => interactionRule(key).alongLimit(SHALLOW, DEEPER);

const SINTAP = 'SINTAP planar flaw interaction, ESIS monograph IFMASS 10, p. 118, Fig. 15';

const ROWS: readonly (readonly [
  quantity: string,
  published: number,
  unit: string,
  kind: CheckKind,
  source: string,
  compute: () => number,
])[] = [
  [
    'length of the rectangle around five points',
    18,
    'mm',
    'closed form',
    'definition',
    () => boundingRectangle(POINTS)?.lengthMm ?? Number.NaN,
  ],
  [
    'height of the rectangle around five points',
    5,
    'mm',
    'closed form',
    'definition',
    () => boundingRectangle(POINTS)?.heightMm ?? Number.NaN,
  ],
  [
    '20 mm at 30° on the plane of the largest stress',
    17.32050807568877,
    'mm',
    'closed form',
    '20 cos 30°',
    () => projectedLength(20, 30),
  ],
  [
    'direction of the largest stress in pure shear',
    45,
    '°',
    'closed form',
    'Mohr’s circle',
    () => principalDirection(0, 0, 80),
  ],
  [
    'area of a half ellipse, a 5, c 15',
    117.8097245096172,
    'mm²',
    'closed form',
    'π a c/2',
    () => boundingArea('surface', 5, 15),
  ],
  [
    '5 mm with a sizing error of 0.8 mm at 95 %',
    6.316,
    'mm',
    'closed form',
    '5 + 1.645 · 0.8',
    () => sizedUp(5, 0, 0.8),
  ],
  [
    'half length of 30 mm with 1.5 mm at each end at 95 %',
    17.4675,
    'mm',
    'closed form',
    '15 + 1.645 · 1.5',
    () => sizedUp(15, 0, 1.5),
  ],
  [
    'gap limit of two long surface flaws',
    0,
    'mm',
    'published table',
    SINTAP,
    () => along('bs-2005'),
  ],
  [
    'a deep and a long surface flaw 7 mm apart interact (1 yes)',
    1,
    '',
    'published table',
    SINTAP,
    () =>
      Number(interacts(surface(6, 4, 0), surface(4, 8, 15), interactionRule('bs-2005')).interacts),
  ],
  [
    'gap limit, max(a1, a2)/2',
    2,
    'mm',
    'from memory',
    'BS 7910:2013, FITNET (from memory)',
    () => along('bs-2013'),
  ],
  [
    'gap limit, c1 + c2',
    14,
    'mm',
    'from memory',
    'API 579-1 Part 9 (from memory)',
    () => along('api-579'),
  ],
  [
    'gap limit, half of the larger depth',
    2,
    'mm',
    'from memory',
    'ASME XI IWA-3300 (from memory)',
    () => along('asme-xi'),
  ],
  [
    'depth of two combined surface flaws',
    4,
    'mm',
    'closed form',
    'the larger of the two',
    () => combined(SHALLOW, DEEPER).a,
  ],
  [
    'length of two combined surface flaws, 2 mm apart',
    30,
    'mm',
    'closed form',
    '2c1 + 2c2 + s',
    () => 2 * combined(SHALLOW, DEEPER).c,
  ],
  [
    'gap limit of two flaws one above the other, a1 + a2',
    5,
    'mm',
    'published table',
    SINTAP,
    () => interacts(embedded(2, 4), embedded(3, 12.5), interactionRule('bs-2005')).limitMm,
  ],
  [
    'height of the two combined',
    14.5,
    'mm',
    'closed form',
    '2a1 + 2a2 + s',
    () => 2 * combined(embedded(2, 4), embedded(3, 12.5)).a,
  ],
  [
    'depth of an embedded flaw near the face, 2a + d',
    7,
    'mm',
    'from memory',
    'API 579-1 Part 9 (from memory)',
    () => api?.surfaceFlaw(3, 10, 1).a ?? Number.NaN,
  ],
  [
    'half length of it, c + d',
    11,
    'mm',
    'from memory',
    'API 579-1 Part 9 (from memory)',
    () => api?.surfaceFlaw(3, 10, 1).c ?? Number.NaN,
  ],
  [
    'depth of an embedded flaw near the face, 2a + S',
    7,
    'mm',
    'from memory',
    'ASME XI IWA-3310 (from memory)',
    () => asme.surfaceFlaw(3, 10, 1).a,
  ],
  [
    'half length of a flaw that breaks through, c + (t − a)',
    34,
    'mm',
    'from memory',
    'API 579-1 Part 9 (from memory)',
    () => through.halfLength(21, 30, 25),
  ],
];

export const CHARACTERISATION_CHECKS: readonly CheckRow[] = ROWS.map(
  ([quantity, published, unit, kind, source, compute], i) => ({
    id: `CH-${i + 1}`,
    group: 'Characterisation',
    quantity,
    published,
    unit,
    tolerance: 1e-9,
    kind,
    source,
    compute,
  }),
);
