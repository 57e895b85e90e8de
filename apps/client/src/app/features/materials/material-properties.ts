import type { MaterialProperty } from '@ligament/domain/contract/materials';
import { given, number, type RecordField, text } from '../../shared/record-form/record-field';

interface Property {
  readonly name: MaterialProperty;
  readonly label: string;
  readonly unit: string;
  readonly digits: number;
}

/** The properties an assessment uses, each with its unit. */
export const PROPERTIES: readonly Property[] = [
  { name: 'yieldMpa', label: 'Yield or 0.2 % proof strength', unit: 'MPa', digits: 0 },
  { name: 'tensileMpa', label: 'Tensile strength', unit: 'MPa', digits: 0 },
  { name: 'youngsModulusMpa', label: 'Young’s modulus', unit: 'MPa', digits: 0 },
  { name: 'poissonsRatio', label: 'Poisson’s ratio', unit: '', digits: 2 },
  { name: 'toughnessMpaSqrtM', label: 'Fracture toughness Kmat', unit: 'MPa√m', digits: 1 },
];

export const MATERIAL_FIELDS: readonly RecordField[] = [
  text('name', 'Name'),
  text('specification', 'Specification'),
  text('heatNo', 'Heat number'),
  ...PROPERTIES.map(({ name, label, unit }) => given(name, unit ? `${label}, ${unit}` : label)),
  number('toughnessTemperatureC', 'Temperature the toughness was found at, °C'),
  { name: 'yieldPlateau', label: 'The stress–strain curve has a yield plateau', kind: 'flag' },
];
