import type { DiagramLimit, DiagramLine } from './diagram-line';
import { levelTwoHeight, type LevelTwoCutOff } from './level-two';
import { lrMax, optionOne, plateauLine, type DiagramMaterial } from './option-one';
import { optionTwoHeight } from './option-two';
import type { StressStrainCurve } from './stress-strain-curve';

const HARDENING: DiagramLimit = {
  name: 'σU/σY',
  text: 'σU/σY ≥ 1',
  min: 1,
  max: Infinity,
  measure: ({ yieldMPa, tensileMPa }) => tensileMPa / yieldMPa,
  source: 'definition',
  input: 'material.tensileMPa',
  instead: 'Check the two strengths; the tensile strength is the larger.',
};

const PLATEAU: DiagramLimit = {
  name: 'σY',
  text: 'σY ≤ 946 MPa with a yield plateau',
  min: 0,
  max: 946,
  measure: ({ yieldMPa }) => yieldMPa,
  source: 'BS 7910:2013 7.3.3 (from memory)',
  input: 'material.yieldPlateau',
  instead: 'Say that the material yields continuously, or give its stress–strain curve.',
};

/** Load ratio at which the flow stress (σY + σU)/2 is reached. */
const atFlowStress = (material: DiagramMaterial): number =>
  lrMax({ ...material, yieldPlateau: false });

/** Where the line of a material with a yield plateau ends. */
export type PlateauEnd = 'at yield' | 'at flow stress';

/**
 * Option 1. With a yield plateau the line ends at Lr = 1 by default, the cautious reading; the published line
 * drops there and goes on to the flow stress.
 */
export function optionOneLine(
  material: DiagramMaterial,
  plateauEnd: PlateauEnd = 'at yield',
): DiagramLine {
  const { yieldPlateau } = material;
  return {
    key: yieldPlateau ? 'option-1-plateau' : 'option-1',
    title: yieldPlateau ? 'Option 1 with a yield plateau' : 'Option 1',
    source: 'BS 7910:2013 7.3.3 (from memory)',
    limits: yieldPlateau ? [HARDENING, PLATEAU] : [HARDENING],
    lrMax: plateauEnd === 'at yield' ? lrMax(material) : atFlowStress(material),
    jumps: yieldPlateau
      ? [{ lr: 1, before: 1 / Math.sqrt(1.5), after: plateauLine(1, material) }]
      : [],
    height: (lr) => optionOne(lr, material),
  };
}

/** Option 2 of a stress–strain curve; it ends at the flow stress, or where the curve does. */
export function optionTwoLine(material: DiagramMaterial, curve: StressStrainCurve): DiagramLine {
  const { yieldMPa } = material;
  const height = (lr: number): number => optionTwoHeight(lr, curve.secantRatio(lr * yieldMPa));
  return {
    key: 'option-2',
    title: `Option 2, ${curve.title}`,
    source: 'BS 7910:2013 7.3.4, R6 (from memory)',
    limits: [HARDENING],
    lrMax: Math.min(atFlowStress(material), curve.lastStressMPa / yieldMPa),
    jumps: curve.steps.map(({ stressMPa, before, after }) => {
      const lr = stressMPa / yieldMPa;
      return { lr, before: optionTwoHeight(lr, before), after: optionTwoHeight(lr, after) };
    }),
    height,
  };
}

/** The curve of one shape for every material, with the cut-off of its kind or of its flow stress. */
export function levelTwoLine(
  cutOff: LevelTwoCutOff | 'flow stress',
  material: DiagramMaterial,
): DiagramLine {
  return {
    key: 'level-2',
    title: 'Level 2, one curve for every material',
    source: 'API 579-1 Part 9 Level 2, R6 revision 3, BS 7910:2005 Level 2A (from memory)',
    limits: [HARDENING],
    lrMax: cutOff === 'flow stress' ? atFlowStress(material) : cutOff.lrMax,
    jumps: [],
    height: levelTwoHeight,
  };
}
