import {
  COMPONENT_KINDS,
  COMPONENT_STATES,
  HEAT_TREATMENTS,
  MECHANISMS,
} from '@ligament/domain/contract/vocabulary';
import {
  type Choice,
  choice,
  choicesOf,
  date,
  number,
  type RecordField,
  text,
} from '../../shared/record-form/record-field';

/** Fields of a component, in the order of a data sheet. */
export const componentFields = (
  units: readonly Choice[],
  materials: readonly Choice[],
): readonly RecordField[] => [
  text('tag', 'Tag'),
  text('description', 'Description'),
  choice('unitId', 'Unit', units),
  choice('kind', 'Kind', choicesOf(COMPONENT_KINDS)),
  number('insideDiameterMm', 'Inside diameter, mm'),
  number('wallMm', 'Nominal wall, mm'),
  number('requiredWallMm', 'Least wall by the design code, mm (may be left empty)'),
  choice('materialId', 'Material', materials),
  choice('heatTreatment', 'Heat treatment of the welds', choicesOf(HEAT_TREATMENTS)),
  choice('mechanism', 'Expected damage mechanism', choicesOf(MECHANISMS)),
  number('designPressureMpa', 'Design pressure, MPa'),
  number('designTemperatureC', 'Design temperature, °C'),
  number('operatingPressureMpa', 'Operating pressure, MPa'),
  number('operatingTemperatureC', 'Operating temperature, °C'),
  number(
    'minimumMetalTemperatureC',
    'Least metal temperature under pressure, °C (may be left empty)',
  ),
  text('fluid', 'Fluid'),
  date('commissionedOn', 'In service since'),
  text('drawingNo', 'Drawing'),
  choice('state', 'State', choicesOf(COMPONENT_STATES)),
];
