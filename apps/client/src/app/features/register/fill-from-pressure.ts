import type { ComponentView } from '@ligament/domain/contract/components';
import {
  axialStress,
  sphereStress,
  thickHoopStress,
} from '@ligament/domain/geometry/pressure-stress';
import { mm, mpa } from '@ligament/domain/units/quantity';
import type { RecordFill } from '../../shared/record-form/record-form';

type Shell = Pick<ComponentView, 'kind' | 'insideDiameterMm' | 'wallMm'>;

/** Stresses of a load case that follow from its pressure, by equilibrium of a closed shell away from discontinuities. */
export const fillFromPressure = (shell: Shell): RecordFill => ({
  label: 'Stresses from the pressure',
  values: ({ pressureMpa }) => {
    if (typeof pressureMpa !== 'number') return 'Enter the pressure first.';
    if (shell.kind === 'head') {
      return 'The stress in a head depends on its form and place: enter it from the design calculation.';
    }
    const [around, bending, along] = stresses(shell, pressureMpa);
    const how = `from ${pressureMpa} MPa, inside diameter ${shell.insideDiameterMm} mm, wall ${shell.wallMm} mm of the register`;
    return {
      ...given('hoopMembraneMpa', around, `Equilibrium, ${how}`),
      ...given('hoopBendingMpa', bending, `Thick wall, tension at the inside, ${how}`),
      ...given('axialMembraneMpa', along, `Closed ends, ${how}`),
      ...given('axialBendingMpa', 0, 'None from pressure away from ends and nozzles'),
    };
  },
});

function stresses({ kind, insideDiameterMm, wallMm }: Shell, pressureMpa: number) {
  const [pressure, radius, wall] = [
    mpa(pressureMpa),
    mm(insideDiameterMm / 2),
    mm(wallMm),
  ] as const;
  const along = axialStress(pressure, radius, wall);
  if (kind === 'sphere') {
    const all = sphereStress(pressure, radius, wall);
    return [all, 0, all] as const;
  }
  const hoop = thickHoopStress(pressure, radius, wall);
  return [hoop.membrane, hoop.bending, along] as const;
}

const given = (name: string, value: number, note: string) => ({
  [name]: Math.round(value * 100) / 100,
  [`${name}-provenance`]: 'standard default',
  [`${name}-note`]: note,
});
