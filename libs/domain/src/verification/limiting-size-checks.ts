import { limitingSize } from '../assessment/limiting-size';
import { sectionOf } from '../assessment/section';
import type { FlawCase } from '../assessment/flaw-case';
import { optionOneLine } from '../fracture/fad/diagram-lines';
import { linearTerms } from '../fracture/stress-intensity/stress-terms';
import { mm } from '../units/quantity';
import type { CheckRow } from './check-row';

const ROWS = [
  [50, 80, 0, 19.82745924838106],
  [75, 80, 0, 15.69613737692961],
  [150, 80, 0, 11.49699354517984],
  [200, 80, 0, 10.56957146124895],
  [50, 120, 105, 19.19137610317165],
  [100, 120, 105, 12.6182114403938],
  [200, 120, 105, 10.00897651432411],
] as const;

const given = (value: number) => ({ value, provenance: 'assumed', note: '' }) as const;

const STEEL = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};

const plate = (toughness: number, residual: number): FlawCase => ({
  situation: {
    shape: 'plate',
    kind: 'surface',
    face: 'inside',
    orientation: 'axial',
    flawedSides: 'one',
  },
  wall: { thickness: mm(25), width: mm(500), insideRadius: mm(Infinity), holeRadius: mm(0) },
  primary: linearTerms(200, 0),
  collapse: linearTerms(200, 0),
  facePressure: 0,
  residual: { state: 'entered', membraneMPa: given(residual), bendingMPa: given(0) },
  material: STEEL,
  line: optionOneLine(STEEL),
  poissonsRatio: 0.3,
  toughness: toughness * Math.sqrt(1000),
  wish: { stressIntensity: null, referenceStress: null, attachmentLength: null },
});

function limitingDepth(length: number, toughness: number, residual: number): number {
  const flaw = {
    kind: 'surface',
    face: 'inside',
    a: 5,
    c: length / 2,
    ligament: 0,
    height: 5,
    sizedHeight: 5,
    sizedLength: length,
    recategorised: false,
    neighbourhood: null,
  } as const;
  return limitingSize(sectionOf(plate(toughness, residual), flaw), flaw).heightMm ?? Number.NaN;
}

export const LIMITING_SIZE_CHECKS: readonly CheckRow[] = ROWS.map(
  ([length, toughness, residual, depth], i) => ({
    id: `LS-${i + 1}`,
    group: 'Limiting size',
    quantity: `limiting depth at 2c = ${length} mm, Kmat ${toughness} MPa·√m, Qm ${residual} MPa (plate, t 25, W 500, Pm 200)`,
    published: depth,
    unit: 'mm',
    tolerance: 4e-4,
    kind: 'independent computation',
    source: 'root search with a separate program on the same published equations',
    compute: () => limitingDepth(length, toughness, residual),
  }),
);
