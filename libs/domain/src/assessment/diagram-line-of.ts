import { brokenLimits, type DiagramLine } from '../fracture/fad/diagram-line';
import { optionOneLine, optionTwoLine } from '../fracture/fad/diagram-lines';
import { measuredCurve } from '../fracture/fad/measured-curve';
import type { DiagramMaterial } from '../fracture/fad/option-one';
import { refused, type Refused } from '../geometry/refusal';
import type { AssessmentInput } from './assessment-input';

/** The line a case is judged by, or why the material has none. */
export type ChosenLine = { readonly status: 'found'; readonly line: DiagramLine } | Refused;

/** Option 2 where a stress–strain curve is given, Option 1 otherwise. */
export function diagramLineOf(
  { material: { stressStrainCurve } }: AssessmentInput,
  material: DiagramMaterial,
): ChosenLine {
  if (!stressStrainCurve) return held(optionOneLine(material), material);
  const measured = measuredCurve({
    points: stressStrainCurve.value,
    values: 'engineering',
    yieldMPa: material.yieldMPa,
    youngsModulusMPa: material.youngsModulusMPa,
  });
  return measured.status === 'refused'
    ? measured
    : held(optionTwoLine(material, measured.curve), material);
}

function held(line: DiagramLine, material: DiagramMaterial): ChosenLine {
  const broken = brokenLimits(line, material);
  return broken.length > 0 ? refused(...broken) : { status: 'found', line };
}
