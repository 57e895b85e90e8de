import { convertParisCoefficient } from '../units/convert-paris';
import { fromFahrenheit, fromMPa, toMPa, toMPaSqrtMm, toMm } from '../units/convert';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import { mpa } from '../units/quantity';
import type { CheckKind, CheckRow } from './check-row';

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  source: string,
  compute: () => number,
  kind: CheckKind = 'closed form',
): CheckRow => ({
  id,
  group: 'Units',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

const METRE = { growth: 'm', range: 'MPa·√m' } as const;
const INCH = { growth: 'in', range: 'ksi·√in' } as const;
const ENGINE = { growth: 'mm', range: 'MPa·√mm' } as const;
const to = (a: number, m: number, unit: typeof METRE | typeof INCH) =>
  convertParisCoefficient(a, m, { from: ENGINE, to: unit });

export const UNIT_CHECKS: readonly CheckRow[] = [
  row('U-1', '1 MPa·√m', 31.62277660168379, 'MPa·√mm', 1e-12, '√1000', () =>
    toMPaSqrtMm(1, 'MPa·√m'),
  ),
  row(
    'U-2',
    '1 ksi·√in',
    1.0988434941,
    'MPa·√m',
    1e-9,
    '6.894757293168 √0.0254',
    () => toMPaSqrtMm(1, 'ksi·√in') / MPA_SQRT_MM_PER['MPa·√m'],
  ),
  row('U-3', '1 ksi', 6.894757293168, 'MPa', 1e-12, 'definition of lbf and inch', () =>
    toMPa(1, 'ksi'),
  ),
  row('U-4', '1 in', 25.4, 'mm', 1e-15, 'definition', () => toMm(1, 'in')),
  row('U-5', '1 MPa', 10, 'bar', 1e-15, 'definition', () => fromMPa(mpa(1), 'bar')),
  row('U-6', '212 °F', 100, '°C', 1e-12, 'definition', () => fromFahrenheit(212)),
  row(
    'U-7',
    'A = 5.21·10⁻¹³, m = 3',
    1.65e-11,
    'm/cycle, MPa·√m',
    2e-3,
    'IIW quotes 1.65·10⁻¹¹ (from memory)',
    () => to(5.21e-13, 3, METRE),
    'from memory',
  ),
  row(
    'U-8',
    'A = 5.21·10⁻¹³, m = 3',
    8.61e-10,
    'in/cycle, ksi·√in',
    1e-3,
    'API 579-1 quotes 8.61·10⁻¹⁰ (from memory)',
    () => to(5.21e-13, 3, INCH),
    'from memory',
  ),
  row(
    'U-9',
    'A = 1.29·10⁻¹², m = 2.88',
    2.69519200880171e-11,
    'm/cycle, MPa·√m',
    1e-9,
    'algebra',
    () => to(1.29e-12, 2.88, METRE),
  ),
  row(
    'U-10',
    'A = 2.1·10⁻¹⁷, m = 5.1',
    9.380355435170214e-13,
    'm/cycle, MPa·√m',
    1e-9,
    'algebra',
    () => to(2.1e-17, 5.1, METRE),
  ),
];
