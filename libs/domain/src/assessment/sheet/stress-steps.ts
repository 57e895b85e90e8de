import {
  isCurved,
  linearised,
  profileOf,
  type StressTerms,
} from '../../fracture/stress-intensity/stress-terms';
import { toMPaSqrtM } from '../../units/convert';
import type { ResidualStressInput } from '../assessment-input';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';

const RESIDUAL: Readonly<
  Record<ResidualStressInput['state'], { formula: string; source: string }>
> = {
  none: { formula: 'none', source: 'Input' },
  entered: { formula: 'as entered', source: 'Input' },
  'as-welded': {
    formula: 'min(σY, (1.4 − σref/σf) σY), σf = (σY + σU)/2',
    source: 'BS 7910:2013 7.1.8.2 (from memory)',
  },
  'proof-tested': {
    formula: 'min(σY, (1.4 − σref,proof/σf) σY), σref,proof of the wall without a flaw',
    source: 'BS 7910:2013 7.1.8.2, relaxation by proof test (from memory)',
  },
  profile: { formula: 'Σ sₙ (x/t)ⁿ as entered, shown by its linear part', source: 'Input' },
  'heat-treated': {
    formula: '0.2 σY (flaw parallel to the weld), 0.3 σY (transverse)',
    source: 'BS 7910:2013 7.1.8.3 (from memory)',
  },
};

/** Stress, stress intensity and reference stress. */
export function stressSteps(subject: SheetSubject): CalculationStep[] {
  return [...referenceSteps(subject), ...residualSteps(subject), ...intensitySteps(subject)];
}

const sizes = ({ section, flaw }: SheetSubject) => [
  `a = ${number(flaw.a)} mm`,
  `c = ${number(flaw.c)} mm`,
  `t = ${number(section.flaw.wall.thickness)} mm`,
];

const loads = ({ section: { flaw } }: SheetSubject) => [
  ...loadTexts(flaw.primary),
  ...(flaw.facePressure > 0 ? [`p on the faces = ${number(flaw.facePressure)} MPa`] : []),
];

/** Membrane and bending of the primary stress, and the polynomial where it has a curve. */
function loadTexts(primary: StressTerms): string[] {
  const { membrane, bending } = linearised(primary);
  const terms = profileOf(primary).map((s, n) => `${number(s)}${n > 0 ? ` (x/t)^${n}` : ''}`);
  return [
    `Pm = ${number(membrane)} MPa`,
    `Pb = ${number(bending)} MPa`,
    ...(isCurved(primary) ? [`σ(x) = ${terms.join(' + ')} MPa`] : []),
  ];
}

function referenceSteps(subject: SheetSubject): CalculationStep[] {
  const { referenceStress } = subject.section.evaluator.solutions;
  const { material, facePressure } = subject.section.flaw;
  const pressure = facePressure > 0 ? ' Pressure on the faces adds p a/t to Pm (equilibrium).' : '';
  return [
    {
      group: 'Reference stress',
      symbol: 'σref',
      name: `${referenceStress.title}. ${referenceStress.basis}${pressure}`,
      value: subject.point.referenceStress,
      unit: 'MPa',
      formula: referenceStress.formula,
      source: referenceStress.source,
      inputs: [...loadTexts(subject.section.flaw.collapse), ...sizes(subject)],
    },
    {
      group: 'Reference stress',
      symbol: 'Lr',
      name: 'Load ratio',
      value: subject.point.lr,
      unit: '',
      formula: 'σref/σY',
      source: 'BS 7910, R6: definition',
      inputs: [
        `σref = ${number(subject.point.referenceStress)} MPa`,
        `σY = ${number(material.yieldMPa)} MPa`,
      ],
    },
  ];
}

function residualSteps({ section, point }: SheetSubject): CalculationStep[] {
  const { residual, material } = section.flaw;
  const { formula, source } = RESIDUAL[residual.state];
  const inputs = [
    `σY = ${number(material.yieldMPa)} MPa`,
    `σref = ${number(point.referenceStress)} MPa`,
  ];
  const step = (symbol: string, name: string, value: number): CalculationStep => ({
    group: 'Residual stress',
    symbol,
    name,
    value,
    unit: 'MPa',
    formula,
    source,
    inputs: residual.state === 'none' ? [] : inputs,
  });
  return [
    step('Qm', 'Residual membrane stress', point.residualMembrane),
    ...(point.residualBending === 0
      ? []
      : [step('Qb', 'Residual bending stress', point.residualBending)]),
  ];
}

function intensitySteps(subject: SheetSubject): CalculationStep[] {
  const { section, point } = subject;
  const { stressIntensity } = section.evaluator.solutions;
  const step = (
    symbol: string,
    name: string,
    value: number,
    stress: readonly string[],
  ): CalculationStep => ({
    group: 'Stress intensity',
    symbol,
    name: `${name} at φ = ${point.angle}°: ${stressIntensity.title}`,
    value: toMPaSqrtM(value),
    unit: 'MPa·√m',
    formula: stressIntensity.formula,
    source: stressIntensity.source,
    inputs: [...stress, ...sizes(subject)],
  });
  return [
    step('KIp', 'From primary stress', point.at.kPrimary, loads(subject)),
    step('KIs', 'From residual stress', point.at.kSecondary, [
      `Qm = ${number(point.residualMembrane)} MPa`,
      `Qb = ${number(point.residualBending)} MPa`,
    ]),
  ];
}
