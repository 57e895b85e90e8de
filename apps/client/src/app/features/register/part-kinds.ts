import {
  type ComponentView,
  type LoadCaseView,
  type LocationView,
  loadCaseBody,
  loadCaseRoutes,
  locationBody,
  locationRoutes,
  operatingCycleBody,
  operatingCycleRoutes,
  type OperatingCycleView,
} from '@ligament/domain/contract/components';
import {
  FACES,
  HEAT_TREATMENTS,
  LOAD_CASE_KINDS,
  LOCATION_KINDS,
} from '@ligament/domain/contract/vocabulary';
import {
  choice,
  choicesOf,
  date,
  given,
  number,
  prose,
  type RecordField,
  text,
} from '../../shared/record-form/record-field';
import type { Checks } from '../../shared/record-form/record-group';

export type PartKind = 'location' | 'load case' | 'operating cycle';
export type Part = LocationView | LoadCaseView | OperatingCycleView;

/** Routes and checks of the three kinds of records below a component. */
export const PART_ROUTES = {
  location: locationRoutes,
  'load case': loadCaseRoutes,
  'operating cycle': operatingCycleRoutes,
} as const;

export const PART_CHECKS: Readonly<Record<PartKind, Checks>> = {
  location: locationBody.shape,
  'load case': loadCaseBody.shape,
  'operating cycle': operatingCycleBody.shape,
};

const LOCATION: readonly RecordField[] = [
  text('name', 'Name, as on the drawing'),
  choice('kind', 'Kind', choicesOf(LOCATION_KINDS)),
  text('datum', 'Datum: where positions are measured from'),
  text('clockZero', 'Zero of the clock position'),
  text('viewingDirection', 'Viewing direction'),
  choice('circumferenceOn', 'Distances around are measured on the', choicesOf(FACES)),
  number('lengthMm', 'Length of the weld, mm (may be left empty)'),
  number('holeRadiusMm', 'Radius of the hole or nozzle bore, mm (only at the edge of one)'),
  choice('heatTreatment', 'Heat treatment', [
    { value: null, label: 'as the component' },
    ...choicesOf(HEAT_TREATMENTS),
  ]),
  prose('description', 'Description'),
];

const LOAD_CASE: readonly RecordField[] = [
  text('name', 'Name'),
  choice('kind', 'Kind', choicesOf(LOAD_CASE_KINDS)),
  number('pressureMpa', 'Pressure, MPa'),
  number('temperatureC', 'Temperature, °C'),
  given('hoopMembraneMpa', 'Membrane stress around the shell, MPa'),
  given('hoopBendingMpa', 'Through-wall bending around the shell, MPa'),
  given('axialMembraneMpa', 'Membrane stress along the shell, MPa'),
  given('axialBendingMpa', 'Through-wall bending along the shell, MPa'),
];

const cycle = (component: ComponentView): readonly RecordField[] => [
  text('name', 'Name'),
  choice(
    'loadCaseId',
    'Load case',
    component.loadCases.map(({ id, name }) => ({ value: id, label: name })),
  ),
  number('rangeFraction', 'Stress range as a fraction of the load case'),
  number('countPerYear', 'Cycles per year'),
  text('source', 'Source of the count'),
  date('periodFrom', 'Counted from'),
  date('periodTo', 'Counted to'),
];

/** Fields of a part's form. */
export function partFields(kind: PartKind, component: ComponentView): readonly RecordField[] {
  if (kind === 'location') return LOCATION;
  return kind === 'load case' ? LOAD_CASE : cycle(component);
}
