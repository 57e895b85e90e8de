import { fillFromPressure } from './fill-from-pressure';

const SHELL = { kind: 'vessel shell', insideDiameterMm: 200, wallMm: 10 } as const;
const filled = (shell: Parameters<typeof fillFromPressure>[0], pressureMpa: unknown) =>
  fillFromPressure(shell).values({ pressureMpa });

describe('fillFromPressure', () => {
  it('gives the stresses of a closed cylinder, thick-wall bending included', () => {
    // equilibrium: p Ri/t = 100, p Ri²/(Ro² − Ri²) = 47.62; Lamé linearised: 4.99
    expect(filled(SHELL, 10)).toMatchObject({
      hoopMembraneMpa: 100,
      hoopBendingMpa: 4.99,
      axialMembraneMpa: 47.62,
      axialBendingMpa: 0,
      'hoopMembraneMpa-provenance': 'standard default',
      'hoopMembraneMpa-note': expect.stringContaining('10 MPa, inside diameter 200 mm, wall 10 mm'),
    });
  });

  it('gives the same in both directions for a sphere', () => {
    expect(filled({ ...SHELL, kind: 'sphere' }, 10)).toMatchObject({
      hoopMembraneMpa: 47.62,
      hoopBendingMpa: 0,
      axialMembraneMpa: 47.62,
    });
  });

  it('gives nothing for a head, or without a pressure', () => {
    expect(filled({ ...SHELL, kind: 'head' }, 10)).toContain('design calculation');
    expect(filled(SHELL, null)).toBe('Enter the pressure first.');
  });
});
