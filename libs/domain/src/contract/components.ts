import * as z from 'zod';
import { VERDICTS } from '../assessment/assessment-outcome';
import {
  between,
  id,
  instant,
  isoDate,
  line,
  listQuery,
  optionalLine,
  page,
  prose,
  reason,
  version,
} from './primitives';
import { route } from './route';
import { materialView, origin } from './materials';
import {
  COMPONENT_KINDS,
  COMPONENT_STATES,
  FACES,
  FLAW_KINDS,
  FLAW_STATES,
  HEAT_TREATMENTS,
  INSPECTION_STATES,
  LOAD_CASE_KINDS,
  LOCATION_KINDS,
  MECHANISMS,
  REINSPECTION_STATES,
  TECHNIQUES,
  URGENCIES,
} from './vocabulary';

const fields = {
  unitId: id,
  tag: line(40),
  description: line(200),
  kind: z.enum(COMPONENT_KINDS),
  insideDiameterMm: between(5, 100_000, 'mm').describe('Inside diameter [mm]'),
  wallMm: between(0.5, 500, 'mm').describe('Nominal wall [mm]'),
  requiredWallMm: between(0, 500, 'mm')
    .nullable()
    .describe('Least wall by the design code, without corrosion allowance [mm]'),
  designPressureMpa: between(-0.2, 200, 'MPa').describe('Design pressure [MPa]'),
  designTemperatureC: between(-273, 1000, '°C').describe('Design temperature [°C]'),
  operatingPressureMpa: between(-0.2, 200, 'MPa').describe('Operating pressure [MPa]'),
  operatingTemperatureC: between(-273, 1000, '°C').describe('Operating temperature [°C]'),
  minimumMetalTemperatureC: between(-273, 1000, '°C')
    .nullable()
    .describe('Least metal temperature under pressure [°C]'),
  materialId: id,
  heatTreatment: z.enum(HEAT_TREATMENTS),
  mechanism: z.enum(MECHANISMS).describe('Expected damage mechanism'),
  fluid: optionalLine(120),
  commissionedOn: isoDate.nullable(),
  drawingNo: optionalLine(60),
  state: z.enum(COMPONENT_STATES),
};

const wallFits = (value: { wallMm?: number; insideDiameterMm?: number }) =>
  value.wallMm === undefined ||
  value.insideDiameterMm === undefined ||
  value.wallMm < value.insideDiameterMm / 2;
const tooThick = {
  error: 'The wall is thicker than the inside radius: check diameter and wall.',
  path: ['wallMm'],
};

export const componentBody = z.strictObject(fields).refine(wallFits, tooThick);
export type ComponentBody = z.infer<typeof componentBody>;
export const componentChange = z
  .strictObject(fields)
  .partial()
  .extend({ reason })
  .refine(wallFits, tooThick);

export const locationBody = z.strictObject({
  name: line(40),
  kind: z.enum(LOCATION_KINDS),
  description: prose(500),
  datum: line(300).describe('Where positions are measured from'),
  clockZero: optionalLine(120),
  viewingDirection: optionalLine(120),
  circumferenceOn: z.enum(FACES).describe('Face on which distances around are measured'),
  lengthMm: between(0, 1_000_000, 'mm').nullable().describe('Length of the weld [mm]'),
  holeRadiusMm: between(1, 10_000, 'mm')
    .nullable()
    .default(null)
    .describe('Radius of the hole or of the nozzle’s bore, at the edge of one [mm]'),
  heatTreatment: z.enum(HEAT_TREATMENTS).nullable().describe('Where it differs from the component'),
});
export type LocationBody = z.infer<typeof locationBody>;
export const locationView = z.object({ ...locationBody.shape, id, componentId: id, version });
export type LocationView = z.infer<typeof locationView>;

const stress = (what: string) => between(-2000, 2000, 'MPa').describe(`${what} [MPa]`);
export const LOAD_CASE_STRESSES = [
  'hoopMembraneMpa',
  'hoopBendingMpa',
  'axialMembraneMpa',
  'axialBendingMpa',
] as const;
export const loadCaseBody = z.strictObject({
  name: line(80),
  kind: z.enum(LOAD_CASE_KINDS),
  pressureMpa: between(-0.2, 200, 'MPa'),
  temperatureC: between(-273, 1000, '°C'),
  hoopMembraneMpa: stress('Membrane stress around the shell; opens axial flaws'),
  hoopBendingMpa: stress(
    'Through-wall bending around the shell, tension at the flawed face positive',
  ),
  axialMembraneMpa: stress('Membrane stress along the shell; opens circumferential flaws'),
  axialBendingMpa: stress('Through-wall bending along the shell'),
  origins: z.record(z.enum(LOAD_CASE_STRESSES), origin),
});
export type LoadCaseBody = z.infer<typeof loadCaseBody>;
export const loadCaseView = z.object({ ...loadCaseBody.shape, id, componentId: id, version });
export type LoadCaseView = z.infer<typeof loadCaseView>;

export const operatingCycleBody = z.strictObject({
  loadCaseId: id,
  name: line(80),
  rangeFraction: between(0, 3, '(fraction)').describe(
    'Stress range as a fraction of the load case',
  ),
  countPerYear: between(0, 1e8, 'cycles per year'),
  source: optionalLine(200),
  periodFrom: isoDate.nullable(),
  periodTo: isoDate.nullable(),
});
export type OperatingCycleBody = z.infer<typeof operatingCycleBody>;
export const operatingCycleView = z.object({
  ...operatingCycleBody.shape,
  id,
  componentId: id,
  version,
});
export type OperatingCycleView = z.infer<typeof operatingCycleView>;

const verdict = z.enum(VERDICTS).nullable();

export const componentRow = z.object({
  id,
  tag: z.string(),
  description: z.string(),
  unitId: id,
  unitCode: z.string(),
  kind: z.enum(COMPONENT_KINDS),
  insideDiameterMm: z.number(),
  wallMm: z.number(),
  designPressureMpa: z.number(),
  mechanism: z.enum(MECHANISMS),
  state: z.enum(COMPONENT_STATES),
  flaws: z.number().int().describe('Flaws neither closed nor removed'),
  worstVerdict: verdict.describe('Of the approved assessments'),
  nextDueOn: isoDate.nullable(),
  urgency: z.enum(URGENCIES).nullable(),
});
export type ComponentRow = z.infer<typeof componentRow>;

export const componentView = z.object({
  ...fields,
  id,
  version,
  updatedAt: instant,
  unit: z.object({ id, code: z.string(), name: z.string() }),
  material: materialView.omit({ components: true }),
  locations: z.array(locationView),
  loadCases: z.array(loadCaseView),
  operatingCycles: z.array(operatingCycleView),
  flaws: z.array(
    z.object({
      id,
      number: z.string(),
      locationName: z.string(),
      kind: z.enum(FLAW_KINDS),
      state: z.enum(FLAW_STATES),
      heightMm: z.number().nullable(),
      lengthMm: z.number().nullable(),
      inspectedOn: isoDate.nullable(),
      verdict,
      dueOn: isoDate.nullable(),
    }),
  ),
  reinspections: z.array(
    z.object({
      id,
      task: z.string(),
      technique: z.enum(TECHNIQUES),
      dueOn: isoDate,
      basis: z.string(),
      state: z.enum(REINSPECTION_STATES),
      windowCode: z.string().nullable(),
      urgency: z.enum(URGENCIES),
    }),
  ),
  inspections: z.array(
    z.object({
      id,
      reportNo: z.string(),
      technique: z.enum(TECHNIQUES),
      inspectedOn: isoDate.nullable(),
      plannedOn: isoDate.nullable(),
      state: z.enum(INSPECTION_STATES),
      findings: z.number().int(),
    }),
  ),
});
export type ComponentView = z.infer<typeof componentView>;

const componentFilters = {
  unit: id.optional(),
  kind: z.enum(COMPONENT_KINDS).optional(),
  state: z.enum(COMPONENT_STATES).optional(),
  mechanism: z.enum(MECHANISMS).optional(),
  sort: z.enum(['tag', '-tag', 'description', '-description', 'due', '-due']).default('tag'),
};

export const listComponents = route({
  method: 'get',
  path: '/api/components',
  summary: 'Components of the register, with their flaws and next due date',
  access: 'register.read',
  query: z.object({ ...listQuery, ...componentFilters }),
  response: page(componentRow),
});

export const exportComponents = route({
  method: 'get',
  path: '/api/components.csv',
  summary: 'The register as a table',
  access: 'register.read',
});

export const addComponent = route({
  method: 'post',
  path: '/api/components',
  summary: 'Add a component to the register',
  access: 'register.write',
  body: componentBody,
  response: componentView,
});

const ofComponent = z.object({ id });

export const readComponent = route({
  method: 'get',
  path: '/api/components/:id',
  summary: 'One component with everything the register knows of it',
  access: 'register.read',
  params: ofComponent,
  response: componentView,
});

export const changeComponent = route({
  method: 'patch',
  path: '/api/components/:id',
  summary: 'Change a component, with a reason',
  access: 'register.write',
  versioned: true,
  params: ofComponent,
  body: componentChange,
  response: componentView,
});

/** The three kinds of records below a component share their shape of routes. */
const below = <B extends z.ZodObject, V extends z.ZodType>(
  name: string,
  path: string,
  body: B,
  view: V,
) => ({
  list: route({
    method: 'get',
    path: `/api/components/:id/${path}`,
    summary: `Each ${name} of a component`,
    access: 'register.read',
    params: ofComponent,
    response: z.object({ rows: z.array(view) }),
  }),
  add: route({
    method: 'post',
    path: `/api/components/:id/${path}`,
    summary: `Add a ${name} to a component`,
    access: 'register.write',
    params: ofComponent,
    body,
    response: view,
  }),
  change: route({
    method: 'patch',
    path: `/api/${path}/:id`,
    summary: `Change a ${name}, with a reason`,
    access: 'register.write',
    versioned: true,
    params: z.object({ id }),
    body: body.partial().extend({ reason }),
    response: view,
  }),
});

export const locationRoutes = below('location', 'locations', locationBody, locationView);
export const loadCaseRoutes = below('load case', 'load-cases', loadCaseBody, loadCaseView);
export const operatingCycleRoutes = below(
  'operating cycle',
  'operating-cycles',
  operatingCycleBody,
  operatingCycleView,
);

export const removeOperatingCycle = route({
  method: 'delete',
  path: '/api/operating-cycles/:id',
  summary: 'Take an operating cycle out of the histogram, with a reason',
  access: 'register.write',
  versioned: true,
  params: z.object({ id }),
  query: z.object({ reason }),
});
