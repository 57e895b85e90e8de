import * as z from 'zod';
import {
  between,
  id,
  instant,
  line,
  listQuery,
  optionalLine,
  page,
  prose,
  provenance,
  reason,
  version,
} from './primitives';
import { route } from './route';

export const origin = z.strictObject({ provenance, note: prose(500) });
export type Origin = z.infer<typeof origin>;

/** Properties of a material whose origin is kept. */
export const MATERIAL_PROPERTIES = [
  'yieldMpa',
  'tensileMpa',
  'youngsModulusMpa',
  'poissonsRatio',
  'toughnessMpaSqrtM',
] as const;
export type MaterialProperty = (typeof MATERIAL_PROPERTIES)[number];

const fields = {
  name: line(120),
  specification: optionalLine(120),
  heatNo: optionalLine(60),
  yieldMpa: between(50, 1500, 'MPa').describe('Yield or 0.2 % proof strength [MPa]'),
  tensileMpa: between(100, 2000, 'MPa').describe('Tensile strength [MPa]'),
  youngsModulusMpa: between(50_000, 250_000, 'MPa').describe('Young’s modulus [MPa]'),
  poissonsRatio: between(0.1, 0.49, '').describe('Poisson’s ratio'),
  toughnessMpaSqrtM: between(5, 600, 'MPa√m').describe('Fracture toughness Kmat [MPa√m]'),
  toughnessTemperatureC: between(-273, 900, '°C').describe(
    'Temperature the toughness was found at [°C]',
  ),
  yieldPlateau: z.boolean().describe('Whether the stress–strain curve has a yield plateau'),
  origins: z.record(z.enum(MATERIAL_PROPERTIES), origin).describe('Where each property comes from'),
};

const strengthsInOrder = (value: { yieldMpa?: number; tensileMpa?: number }) =>
  value.yieldMpa === undefined ||
  value.tensileMpa === undefined ||
  value.tensileMpa >= value.yieldMpa;
const disorder = {
  error: 'Tensile strength cannot be below yield strength.',
  path: ['tensileMpa'],
};

export const materialBody = z.strictObject(fields).refine(strengthsInOrder, disorder);
export type MaterialBody = z.infer<typeof materialBody>;

export const materialView = z.object({
  ...fields,
  id,
  version,
  updatedAt: instant,
  components: z.number().int().describe('How many components are made of it'),
});
export type MaterialView = z.infer<typeof materialView>;

export const listMaterials = route({
  method: 'get',
  path: '/api/materials',
  summary: 'Materials of the site',
  access: 'register.read',
  query: z.object(listQuery),
  response: page(materialView),
});

export const readMaterial = route({
  method: 'get',
  path: '/api/materials/:id',
  summary: 'One material with the origin of each property',
  access: 'register.read',
  params: z.object({ id }),
  response: materialView,
});

export const addMaterial = route({
  method: 'post',
  path: '/api/materials',
  summary: 'Add a material',
  access: 'materials.write',
  body: materialBody,
  response: materialView,
});

export const changeMaterial = route({
  method: 'patch',
  path: '/api/materials/:id',
  summary: 'Change a material; assessments already made keep the values they used',
  access: 'materials.write',
  versioned: true,
  params: z.object({ id }),
  body: z.strictObject(fields).partial().extend({ reason }).refine(strengthsInOrder, disorder),
  response: materialView,
});
