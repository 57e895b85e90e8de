import {
  ellipseInStrip,
  holeInStrip,
  holeInStripHeywood,
} from '../fracture/stress-raisers/strip-factors';
import type { CheckKind, CheckRow } from './check-row';
import { COLLOCATED_ELLIPSES, COLLOCATED_HOLES, HOWLAND } from './data/strip-factors';

const row = (
  id: string,
  quantity: string,
  published: number,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Stress raisers',
  quantity,
  published,
  unit: '',
  tolerance,
  kind,
  source,
  compute,
});

const strips = HOWLAND.flatMap(([share, gross], i) => [
  row(
    `SR-H${i + 1}`,
    `gross peak factor of a hole in a strip, d/W = ${share}`,
    gross,
    0.006,
    'from memory',
    'Howland 1930, table (from memory)',
    () => holeInStrip(share).gross,
  ),
  row(
    `SR-W${i + 1}`,
    `the same by Heywood’s form, d/W = ${share}`,
    gross,
    0.02,
    'from memory',
    'Howland 1930, table (from memory)',
    () => holeInStripHeywood(share).gross,
  ),
]);

const COLLOCATION =
  'own boundary collocation of both potentials in a rectangle three widths long, within 0.1 %';
const collocated = COLLOCATED_HOLES.map(([share, gross], i) =>
  row(
    `SR-C${i + 1}`,
    `gross peak factor of a hole in a strip, d/W = ${share}`,
    gross,
    0.01,
    'independent computation',
    COLLOCATION,
    () => holeInStrip(share).gross,
  ),
);
const collocatedEllipses = COLLOCATED_ELLIPSES.map(([slenderness, share, net], i) =>
  row(
    `SR-D${i + 1}`,
    `net peak factor of an ellipse in a strip, A/B = ${slenderness}, 2A/W = ${share}`,
    net,
    slenderness < 1 ? 0.045 : 0.03,
    'independent computation',
    COLLOCATION,
    () => ellipseInStrip(slenderness, share).net,
  ),
);

const ellipseStrips = [0.5, 1, 4, 10].map((slenderness, i) =>
  row(
    `SR-E${i + 1}`,
    `net peak factor of an ellipse in a very wide strip, A/B = ${slenderness}`,
    1 + 2 * slenderness,
    1e-12,
    'exact limit',
    'Inglis 1913, the strip without end',
    () => ellipseInStrip(slenderness, 0).net,
  ),
);

export const STRIP_FACTOR_CHECKS: readonly CheckRow[] = [
  ...strips,
  ...ellipseStrips,
  ...collocated,
  ...collocatedEllipses,
];
