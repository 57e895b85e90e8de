import { CATALOGUE, type CatalogueKey } from '../fracture/catalogue';
import type { CheckRow } from './check-row';
import { influenceOf } from './crack-of';
import { FINITE_ELEMENT_ROWS } from './data/finite-element-rows';

const SOURCE = 'own finite elements, spectral elements with energy release rate';

// the equations are fits with a published scatter of 5 %; the finite elements themselves carry 1 % to 2 %
const TOLERANCE = 0.06;

type Row = (typeof FINITE_ELEMENT_ROWS)[number];

/** Where the solutions of the rows stand in the catalogue. */
const PLACE: Readonly<Record<Row[0], CatalogueKey>> = {
  'plate surface': 'plate surface',
  'plate embedded': 'plate embedded',
  'axial inside': 'axial inside surface',
  'axial outside': 'axial outside surface',
  'circumferential inside': 'circumferential inside surface',
};

const factor = ([solution, aspect, depth, angle]: Row): number => {
  const a = 1;
  const embedded = solution === 'plate embedded';
  const t = embedded ? (2 * a) / depth : a / depth;
  const symbols = {
    a,
    c: a / aspect,
    t,
    p: embedded ? t / 2 - a : 0,
    Ri: solution.startsWith('plate') ? Infinity : 10 * t,
  };
  const { membrane } = influenceOf(CATALOGUE[PLACE[solution]].stressIntensity[0], symbols, angle);
  return membrane / Math.sqrt(Math.PI * a);
};

export const CURVATURE_CHECKS: readonly CheckRow[] = FINITE_ELEMENT_ROWS.map((row, i) => {
  const [solution, aspect, depth, angle, membrane] = row;
  return {
    id: `FE-${i + 1}`,
    group: 'Stress intensity against finite elements',
    quantity: `${solution}, a/c ${aspect}, a/t ${depth}, φ ${angle}°: K/(σ√(πa)) in tension`,
    published: membrane,
    unit: '',
    tolerance: TOLERANCE,
    kind: 'independent computation',
    source: SOURCE,
    compute: () => factor(row),
  };
});
