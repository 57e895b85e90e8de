/** A heat of the demonstration plant; toughness in MPa·√m at the temperature beside it. */
export interface DemoMaterial {
  readonly name: string;
  readonly specification: string;
  readonly heatNo: string;
  readonly yieldMpa: number;
  readonly tensileMpa: number;
  readonly toughnessMpaSqrtM: number;
  readonly toughnessTemperatureC: number;
  /** How the toughness is known. */
  readonly toughness: {
    readonly provenance: 'measured' | 'certificate' | 'standard default' | 'assumed';
    readonly note: string;
  };
}

const charpy = (note: string) => ({ provenance: 'certificate' as const, note });
const assumed = (note: string) => ({ provenance: 'assumed' as const, note });

export const MATERIALS: readonly DemoMaterial[] = [
  {
    name: '2.25Cr-1Mo plate, R-101',
    specification: '2.25Cr-1Mo plate with austenitic overlay',
    heatNo: 'S7714',
    yieldMpa: 310,
    tensileMpa: 517,
    toughnessMpaSqrtM: 120,
    toughnessTemperatureC: 40,
    toughness: charpy('Lower bound from Charpy of coupon set 3, certificate S7714-2'),
  },
  {
    name: 'C-0.5Mo plate, E-102',
    specification: 'C-0.5Mo plate',
    heatNo: 'K2209',
    yieldMpa: 275,
    tensileMpa: 450,
    toughnessMpaSqrtM: 60,
    toughnessTemperatureC: 20,
    toughness: assumed('No impact tests on the certificate'),
  },
  {
    name: 'A516-70 plate, V-103',
    specification: 'A516 grade 70',
    heatNo: 'M5518',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 90,
    toughnessTemperatureC: 0,
    toughness: charpy('Charpy 48 J at -20 °C, certificate M5518'),
  },
  {
    name: 'A516-70 plate, V-104 and V-404',
    specification: 'A516 grade 70',
    heatNo: 'M5531',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 90,
    toughnessTemperatureC: 0,
    toughness: charpy('Charpy 52 J at -20 °C, certificate M5531'),
  },
  {
    name: 'A335-P22 pipe',
    specification: 'A335 grade P22',
    heatNo: 'T1187',
    yieldMpa: 205,
    tensileMpa: 415,
    toughnessMpaSqrtM: 100,
    toughnessTemperatureC: 20,
    toughness: charpy('Lower bound from Charpy, certificate T1187'),
  },
  {
    name: '1.25Cr-0.5Mo plate, E-106',
    specification: '1.25Cr-0.5Mo plate',
    heatNo: 'S6120',
    yieldMpa: 240,
    tensileMpa: 450,
    toughnessMpaSqrtM: 90,
    toughnessTemperatureC: 20,
    toughness: charpy('Lower bound from Charpy, certificate S6120'),
  },
  {
    name: 'A516-70 plate, C-201 and C-202',
    specification: 'A516 grade 70',
    heatNo: 'M4903',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 85,
    toughnessTemperatureC: 10,
    toughness: charpy('Charpy 44 J at -10 °C, certificate M4903'),
  },
  {
    name: 'A516-70 plate, E-203',
    specification: 'A516 grade 70',
    heatNo: 'M4810',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 80,
    toughnessTemperatureC: 10,
    toughness: assumed('Certificate lost; taken as the lowest of sister heats'),
  },
  {
    name: 'A106-B pipe, L-204',
    specification: 'A106 grade B',
    heatNo: 'P3305',
    yieldMpa: 245,
    tensileMpa: 415,
    toughnessMpaSqrtM: 75,
    toughnessTemperatureC: 20,
    toughness: {
      provenance: 'standard default',
      note: 'Lower-bound correlation from the specified impact energy',
    },
  },
  {
    name: 'A106-B pipe, L-304',
    specification: 'A106 grade B',
    heatNo: 'P3341',
    yieldMpa: 240,
    tensileMpa: 415,
    toughnessMpaSqrtM: 75,
    toughnessTemperatureC: 20,
    toughness: {
      provenance: 'standard default',
      note: 'Lower-bound correlation from the specified impact energy',
    },
  },
  {
    name: 'A515-70 plate, B-301',
    specification: 'A515 grade 70',
    heatNo: 'H0917',
    yieldMpa: 215,
    tensileMpa: 440,
    toughnessMpaSqrtM: 120,
    toughnessTemperatureC: 200,
    toughness: assumed(
      'Upper-shelf value assumed at operating temperature; cold start needs its own case',
    ),
  },
  {
    name: 'A285-C plate, D-302',
    specification: 'A285 grade C',
    heatNo: 'H0442',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 60,
    toughnessTemperatureC: 20,
    toughness: assumed('No impact tests on the certificate'),
  },
  {
    name: 'P355GH plate, R-401 to R-403',
    specification: 'EN 10028-2 P355GH',
    heatNo: 'B8830',
    yieldMpa: 285,
    tensileMpa: 460,
    toughnessMpaSqrtM: 60,
    toughnessTemperatureC: 20,
    toughness: charpy('Lower bound from Charpy 31 J at 0 °C, certificate B8830'),
  },
  {
    name: 'A516-70 plate, V-405',
    specification: 'A516 grade 70',
    heatNo: 'M6072',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 90,
    toughnessTemperatureC: 0,
    toughness: charpy('Charpy 50 J at -20 °C, certificate M6072'),
  },
  {
    name: 'A537-1 plate, A-406 and A-407',
    specification: 'A537 class 1',
    heatNo: 'N2216',
    yieldMpa: 345,
    tensileMpa: 490,
    toughnessMpaSqrtM: 95,
    toughnessTemperatureC: -20,
    toughness: charpy('Charpy 61 J at -40 °C, certificate N2216'),
  },
  {
    name: 'P460NL1 plate, T-501',
    specification: 'EN 10028-3 P460NL1',
    heatNo: 'B9107',
    yieldMpa: 460,
    tensileMpa: 570,
    toughnessMpaSqrtM: 110,
    toughnessTemperatureC: -20,
    toughness: {
      provenance: 'measured',
      note: 'CTOD tests of the procedure plate, report WL-88, converted',
    },
  },
  {
    name: 'P355 plate, low Charpy heat, V-502',
    specification: 'P355 type',
    heatNo: 'B7702',
    yieldMpa: 285,
    tensileMpa: 460,
    toughnessMpaSqrtM: 75,
    toughnessTemperatureC: 5,
    toughness: charpy('27 J transition at +2 °C, certificate B7702; 45 MPa√m at -20 °C'),
  },
  {
    name: 'A516-70 forged cover, F-503',
    specification: 'A516 grade 70',
    heatNo: 'M6120',
    yieldMpa: 260,
    tensileMpa: 485,
    toughnessMpaSqrtM: 90,
    toughnessTemperatureC: 0,
    toughness: charpy('Charpy 47 J at -20 °C, certificate M6120'),
  },
  {
    name: '304L plate, E-504',
    specification: 'EN 1.4307 / 304L',
    heatNo: 'X3304',
    yieldMpa: 200,
    tensileMpa: 500,
    toughnessMpaSqrtM: 140,
    toughnessTemperatureC: 20,
    toughness: {
      provenance: 'standard default',
      note: 'Lower value for austenitic weld metal, common practice',
    },
  },
];
