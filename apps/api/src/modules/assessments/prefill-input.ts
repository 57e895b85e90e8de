import type {
  AssessmentInput,
  FlawInput,
  MaterialInput,
  SizingInput,
  StressInput,
  WallInput,
} from '@ligament/domain/assessment/assessment-input';
import type { SiteRules } from '@ligament/domain/contract/site-rules';
import type { SizeQualifier } from '@ligament/domain/contract/vocabulary';
import type { Origins } from '@ligament/domain/schema/materials';
import type { Given } from '@ligament/domain/units/provenance';
import type { AssessmentBasis } from './assessment-basis.repository';
import { cornerOf, startsFromCorner } from './corner-of';
import { prefillGrowth } from './prefill-growth';
import { prefillResidual } from './prefill-residual';

/** Growth is followed this far; a longer life is never shown as a figure. */
const HORIZON_YEARS = 40;

/** The inputs an assessment starts with: from register, finding and site lists, each saying where it comes from. */
export function prefillInput(
  basis: AssessmentBasis,
  rules: SiteRules,
  rulesNumber: number,
): AssessmentInput {
  return {
    wall: wallOf(basis),
    flaw: flawOf(basis),
    sizing: sizingOf(basis, rules, rulesNumber),
    stress: stressOf(basis),
    material: materialOf(basis),
    growth: prefillGrowth(basis),
    horizonYears: HORIZON_YEARS,
  };
}

function wallOf(basis: AssessmentBasis): WallInput {
  const { component, finding } = basis;
  const nominal = `Nominal wall, drawing ${component.drawingNo || 'not named'}`;
  const thicknessMm: Given =
    finding.wallMm === null
      ? { value: component.wallMm, provenance: 'certificate', note: nominal }
      : { value: finding.wallMm, provenance: 'measured', note: 'Wall measured at the indication' };
  const drawing = `Drawing ${component.drawingNo || 'not named'}`;
  if (finding.kind === 'corner') return cornerWall(basis, thicknessMm, drawing);
  // the crown of a head is taken as flat; its knuckle is no case for these solutions
  if (component.kind === 'head') return { shape: 'plate', thicknessMm, widthMm: null };
  return {
    shape: component.kind === 'sphere' ? 'sphere' : 'cylinder',
    thicknessMm,
    insideDiameterMm: {
      value: component.insideDiameterMm,
      provenance: 'certificate',
      note: drawing,
    },
  };
}

/** The corner of a nozzle's bore, the edge of a hole, or without either the edge of a plate. */
function cornerWall({ location }: AssessmentBasis, thicknessMm: Given, drawing: string): WallInput {
  if (location.holeRadiusMm === null) return { shape: 'plate', thicknessMm, widthMm: null };
  const holeRadiusMm: Given = {
    value: location.holeRadiusMm,
    provenance: 'certificate',
    note: `${location.name}: ${drawing}`,
  };
  return startsFromCorner(location, thicknessMm.value)
    ? { shape: 'nozzle corner', thicknessMm, holeRadiusMm }
    : { shape: 'hole edge', thicknessMm, holeRadiusMm, widthMm: null, flawedSides: 'one' };
}

function flawOf({ finding, inspection }: AssessmentBasis): FlawInput {
  const report = `Report ${inspection.reportNo}, ${inspection.technique}`;
  const measured = (value: number, qualifier: SizeQualifier): Given => ({
    value,
    provenance: 'measured',
    note:
      qualifier === '='
        ? report
        : `${report}; reported as ${qualifier} ${value} mm, the bound is used`,
  });
  return {
    kind: finding.kind,
    face: finding.face,
    orientation: finding.orientation,
    heightMm: measured(finding.heightMm, finding.heightQualifier),
    lengthMm: measured(finding.lengthMm, finding.lengthQualifier),
    ligamentMm: finding.kind === 'embedded' ? ligamentOf(finding.ligamentMm, measured) : null,
  };
}

/** A ligament nobody recorded is taken as none: the flaw is then assessed as breaking the surface. */
const ligamentOf = (
  ligamentMm: number | null,
  measured: (value: number, qualifier: SizeQualifier) => Given,
): Given =>
  ligamentMm === null
    ? { value: 0, provenance: 'assumed', note: 'No ligament recorded: taken as none' }
    : measured(ligamentMm, '=');

function sizingOf(
  { inspection }: AssessmentBasis,
  rules: SiteRules,
  rulesNumber: number,
): SizingInput {
  const note = `Site rules version ${rulesNumber}, ${inspection.technique}`;
  return {
    heightAllowanceMm: {
      value: rules.heightAllowanceMmByTechnique[inspection.technique],
      provenance: 'standard default',
      note,
    },
    lengthAllowanceMm: {
      value: rules.lengthAllowanceMmByTechnique[inspection.technique],
      provenance: 'standard default',
      note,
    },
  };
}

/** Stress normal to the flaw; at the corner of a nozzle that of the hole, concentration included. */
function stressOf(basis: AssessmentBasis): StressInput {
  const plain = shellStress(basis);
  const corner = cornerOf(basis, basis.loadCase);
  if (!corner) return plain;
  return {
    ...plain,
    peakProfileMPa: {
      value: [corner.membraneMPa + corner.bendingMPa, -2 * corner.bendingMPa].map(rounded),
      provenance: 'standard default',
      note: `Load case ${basis.loadCase.name} at the edge of the hole (Kirsch 1898), peak ${rounded(corner.peakFactor)} times; a straight line through half of the wall`,
    },
  };
}

const rounded = (value: number): number => Math.round(value * 10) / 10;

function shellStress(basis: AssessmentBasis): StressInput {
  const { finding, loadCase } = basis;
  const hoop = finding.orientation === 'axial';
  const membrane = hoop ? 'hoopMembraneMpa' : 'axialMembraneMpa';
  const bending = hoop ? 'hoopBendingMpa' : 'axialBendingMpa';
  const opensToBore = finding.kind === 'surface' && finding.face === 'inside';
  return {
    primaryMembraneMPa: fromOrigins(
      loadCase[membrane],
      loadCase.origins,
      membrane,
      `Load case ${loadCase.name}`,
    ),
    primaryBendingMPa: fromOrigins(
      loadCase[bending],
      loadCase.origins,
      bending,
      `Load case ${loadCase.name}`,
    ),
    residual: prefillResidual(basis),
    crackFacePressureMPa: opensToBore
      ? {
          value: Math.max(0, loadCase.pressureMpa),
          provenance: 'standard default',
          note: `Pressure of load case ${loadCase.name} reaches the crack faces`,
        }
      : null,
  };
}

function materialOf({ material }: AssessmentBasis): MaterialInput {
  const from = (value: number, property: string) =>
    fromOrigins(value, material.origins, property, material.name);
  return {
    yieldMPa: from(material.yieldMpa, 'yieldMpa'),
    tensileMPa: from(material.tensileMpa, 'tensileMpa'),
    youngsModulusMPa: from(material.youngsModulusMpa, 'youngsModulusMpa'),
    poissonsRatio: from(material.poissonsRatio, 'poissonsRatio'),
    toughnessMPaSqrtM: from(material.toughnessMpaSqrtM, 'toughnessMpaSqrtM'),
    yieldPlateau: material.yieldPlateau,
  };
}

function fromOrigins(value: number, origins: Origins, property: string, what: string): Given {
  const origin = origins[property];
  return origin
    ? { value, provenance: origin.provenance, note: origin.note ? `${what}: ${origin.note}` : what }
    : { value, provenance: 'assumed', note: `${what}: no origin recorded` };
}
