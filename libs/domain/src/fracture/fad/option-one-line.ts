import { linePoints, type LinePoint } from './diagram-line';
import { optionOneLine as lineOf } from './diagram-lines';
import type { DiagramMaterial } from './option-one';

/** The Option 1 line as points from Lr = 0 to the cut-off and down to the axis, for drawing. */
export const optionOneLine = (material: DiagramMaterial, intervals = 60): readonly LinePoint[] =>
  linePoints(lineOf(material), intervals);
