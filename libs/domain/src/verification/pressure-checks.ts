import { lameHoopStress, thickHoopStress } from '../geometry/pressure-stress';
import { mm, mpa } from '../units/quantity';
import type { CheckRow } from './check-row';

const at = (radius: number) => lameHoopStress(mpa(10), mm(100), mm(110), mm(radius));
const thick = thickHoopStress(mpa(10), mm(100), mm(10));

/** First moment of Lamé's distribution by Simpson's rule: independent of the closed form. */
function bendingByQuadrature(): number {
  const n = 2000;
  const value = (x: number) => at(100 + x) * (5 - x);
  let sum = value(0) + value(10);
  for (let i = 1; i < n; i++) sum += value((10 * i) / n) * (i % 2 === 1 ? 4 : 2);
  return (6 / 100) * ((sum * 10) / n / 3);
}

const row = (
  id: string,
  quantity: string,
  published: number,
  tolerance: number,
  source: string,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Stress from pressure',
  quantity,
  published,
  unit: 'MPa',
  tolerance,
  kind: 'exact limit',
  source,
  compute,
});

export const PRESSURE_CHECKS: readonly CheckRow[] = [
  row('P-1', 'hoop stress at the bore, 10 MPa, Ri 100, Ro 110', 105.238095238, 1e-9, 'Lamé', () =>
    at(100),
  ),
  row('P-2', 'hoop stress at the outside', 95.2380952381, 1e-9, 'Lamé', () => at(110)),
  row(
    'P-3',
    'mean over the wall',
    100,
    1e-12,
    'equilibrium of half a cylinder',
    () => thick.membrane,
  ),
  row(
    'P-4',
    'bending part of the same',
    bendingByQuadrature(),
    1e-9,
    'Simpson’s rule on Lamé’s distribution',
    () => thick.bending,
  ),
];
