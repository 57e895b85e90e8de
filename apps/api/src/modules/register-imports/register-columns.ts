/** A column of a register table: its name in the file, the field it fills, and how it is read. */
export interface RegisterColumn {
  readonly header: string;
  readonly field: string;
  readonly kind: 'text' | 'number' | 'unit' | 'material';
  /** Whether a row without it can be taken. */
  readonly optional?: true;
  /** Used where an optional cell is empty. */
  readonly fallback?: string | null;
}

const text = (header: string, field: string): RegisterColumn => ({ header, field, kind: 'text' });
const number = (header: string, field: string): RegisterColumn => ({
  header,
  field,
  kind: 'number',
});
const optional = (column: RegisterColumn, fallback: string | null): RegisterColumn => ({
  ...column,
  optional: true,
  fallback,
});

export const REGISTER_COLUMNS: readonly RegisterColumn[] = [
  text('tag', 'tag'),
  text('description', 'description'),
  { header: 'unit', field: 'unitId', kind: 'unit' },
  text('kind', 'kind'),
  number('inside_diameter_mm', 'insideDiameterMm'),
  number('wall_mm', 'wallMm'),
  optional(number('required_wall_mm', 'requiredWallMm'), null),
  number('design_pressure_mpa', 'designPressureMpa'),
  number('design_temperature_c', 'designTemperatureC'),
  number('operating_pressure_mpa', 'operatingPressureMpa'),
  number('operating_temperature_c', 'operatingTemperatureC'),
  optional(number('minimum_metal_temperature_c', 'minimumMetalTemperatureC'), null),
  { header: 'material', field: 'materialId', kind: 'material' },
  text('heat_treatment', 'heatTreatment'),
  text('mechanism', 'mechanism'),
  optional(text('fluid', 'fluid'), ''),
  optional(text('commissioned_on', 'commissionedOn'), null),
  optional(text('drawing_no', 'drawingNo'), ''),
  optional(text('state', 'state'), 'in service'),
];

/** Header as it is compared: case, spaces and hyphens do not matter. */
export const plainHeader = (header: string): string =>
  header
    .trim()
    .toLowerCase()
    .replaceAll(/[\s-]+/g, '_');
