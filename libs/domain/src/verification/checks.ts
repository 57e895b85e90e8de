import { CORROSION_EXAMPLE_CHECKS } from './corrosion-example-checks';
import { COLLAPSE_CHECKS } from './collapse-checks';
import { CURVATURE_CHECKS } from './curvature-checks';
import { CURVED_K_CHECKS } from './curved-k-checks';
import { CURVED_K_ELEMENT_CHECKS } from './curved-k-element-checks';
import { CHARACTERISATION_CHECKS } from './characterisation-checks';
import { evaluateRow, type CheckResult, type CheckRow } from './check-row';
import { DETECTION_CHECKS } from './detection-checks';
import { DIAGRAM_CHECKS } from './diagram-checks';
import { DIAGRAM_LINE_CHECKS } from './diagram-line-checks';
import { END_TO_END_CHECKS } from './end-to-end-checks';
import { FLAT_K_CHECKS } from './flat-k-checks';
import { FLAT_K_ELEMENT_CHECKS } from './flat-k-element-checks';
import { GROWTH_EXAMPLE_CHECKS } from './growth-example-checks';
import { GROWTH_FORM_CHECKS } from './growth-form-checks';
import { GROWTH_LAW_CHECKS } from './growth-law-checks';
import { GROWTH_LIFE_CHECKS } from './growth-life-checks';
import { GROWTH_SPECTRUM_CHECKS } from './growth-spectrum-checks';
import { GROWTH_SURFACE_CHECKS } from './growth-surface-checks';
import { GROWTH_TIME_CHECKS } from './growth-time-checks';
import { INTERVAL_CHECKS } from './interval-checks';
import { LIMITING_LOCUS_CHECKS } from './limiting-locus-checks';
import { LIMITING_SIZE_CHECKS } from './limiting-size-checks';
import { MASTER_CURVE_CHECKS } from './master-curve-checks';
import { PRESSURE_CHECKS } from './pressure-checks';
import { REFERENCE_STRESS_CHECKS } from './reference-stress-checks';
import { RELIABILITY_CHECKS } from './reliability-checks';
import { STRESS_INTENSITY_CHECKS } from './stress-intensity-checks';
import { STRESS_RAISER_CHECKS } from './stress-raiser-checks';
import { THROUGH_WALL_LIFE_CHECKS } from './through-wall-life-checks';
import { TIP_FIELD_CHECKS } from './tip-field-checks';
import { TOUGHNESS_CHECKS } from './toughness-checks';
import { UNIT_CHECKS } from './unit-checks';
import { WELD_TOE_CHECKS } from './weld-toe-checks';

/** Every value the engine is checked against, in the order of the computation. */
export const CHECK_ROWS: readonly CheckRow[] = [
  ...UNIT_CHECKS,
  ...PRESSURE_CHECKS,
  ...CHARACTERISATION_CHECKS,
  ...STRESS_RAISER_CHECKS,
  ...TIP_FIELD_CHECKS,
  ...STRESS_INTENSITY_CHECKS,
  ...FLAT_K_CHECKS,
  ...CURVED_K_CHECKS,
  ...WELD_TOE_CHECKS,
  ...CURVATURE_CHECKS,
  ...FLAT_K_ELEMENT_CHECKS,
  ...CURVED_K_ELEMENT_CHECKS,
  ...REFERENCE_STRESS_CHECKS,
  ...COLLAPSE_CHECKS,
  ...TOUGHNESS_CHECKS,
  ...MASTER_CURVE_CHECKS,
  ...DIAGRAM_CHECKS,
  ...DIAGRAM_LINE_CHECKS,
  ...GROWTH_LAW_CHECKS,
  ...GROWTH_FORM_CHECKS,
  ...GROWTH_LIFE_CHECKS,
  ...GROWTH_SPECTRUM_CHECKS,
  ...GROWTH_SURFACE_CHECKS,
  ...GROWTH_TIME_CHECKS,
  ...GROWTH_EXAMPLE_CHECKS,
  ...CORROSION_EXAMPLE_CHECKS,
  ...LIMITING_SIZE_CHECKS,
  ...LIMITING_LOCUS_CHECKS,
  ...RELIABILITY_CHECKS,
  ...DETECTION_CHECKS,
  ...INTERVAL_CHECKS,
  ...END_TO_END_CHECKS,
  ...THROUGH_WALL_LIFE_CHECKS,
];

/** Computes every row here and now. */
export const evaluateChecks = (): readonly CheckResult[] => CHECK_ROWS.map(evaluateRow);
