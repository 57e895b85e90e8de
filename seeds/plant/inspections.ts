import type {
  Face,
  FlawKind,
  IndicationType,
  Orientation,
  Technique,
} from '@ligament/domain/contract/vocabulary';

export interface DemoFinding {
  /** Flaw of the component this finding is about, e.g. F01. */
  readonly flaw: string;
  readonly type?: IndicationType;
  readonly kind?: FlawKind;
  readonly face?: Face;
  readonly orientation: Orientation;
  /** Depth a, or full height 2a when embedded. */
  readonly heightMm: number;
  readonly lengthMm: number;
  readonly ligamentMm?: number;
  readonly axialMm?: number;
  readonly circumferentialMm?: number;
  readonly remarks?: string;
}

export interface DemoInspection {
  readonly reportNo: string;
  readonly tag: string;
  readonly technique: Technique;
  readonly on: string;
  readonly findings: readonly DemoFinding[];
}

const axial = 'axial' as const;
const around = 'circumferential' as const;

export const INSPECTIONS: readonly DemoInspection[] = [
  {
    reportNo: 'BW-20-041',
    tag: 'R-101',
    technique: 'PAUT',
    on: '2020-05-14',
    findings: [
      {
        flaw: 'F01',
        type: 'slag',
        kind: 'embedded',
        orientation: around,
        heightMm: 4,
        lengthMm: 28,
        ligamentMm: 31,
        circumferentialMm: 2360,
      },
    ],
  },
  {
    reportNo: 'BW-20-055',
    tag: 'E-102',
    technique: 'UT',
    on: '2020-05-18',
    findings: [
      {
        flaw: 'F01',
        type: 'unknown',
        orientation: axial,
        heightMm: 8.6,
        lengthMm: 400,
        remarks: 'Local wall 33.4 mm of 42; loss of back-wall echo, hydrogen attack suspected',
      },
    ],
  },
  {
    reportNo: 'BW-21-019',
    tag: 'V-404',
    technique: 'UT',
    on: '2021-03-09',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        orientation: axial,
        heightMm: 5.2,
        lengthMm: 38,
        axialMm: 1210,
      },
    ],
  },
  {
    reportNo: 'BW-21-060',
    tag: 'D-302',
    technique: 'TOFD',
    on: '2021-06-02',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 1.4, lengthMm: 40, circumferentialMm: 3120 },
    ],
  },
  {
    reportNo: 'BW-21-112',
    tag: 'C-202',
    technique: 'UT',
    on: '2021-11-12',
    findings: [
      { flaw: 'F01', orientation: axial, heightMm: 1.5, lengthMm: 20, circumferentialMm: 940 },
    ],
  },
  {
    reportNo: 'BW-21-127',
    tag: 'L-105',
    technique: 'PAUT',
    on: '2021-12-15',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 1.5, lengthMm: 18, circumferentialMm: 210 },
    ],
  },
  {
    reportNo: 'BW-22-031',
    tag: 'V-104',
    technique: 'UT',
    on: '2022-04-20',
    findings: [{ flaw: 'F01', orientation: axial, heightMm: 2.5, lengthMm: 46, axialMm: 2050 }],
  },
  {
    reportNo: 'BW-22-077',
    tag: 'A-406',
    technique: 'TOFD',
    on: '2022-09-06',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        kind: 'embedded',
        orientation: axial,
        heightMm: 5.6,
        lengthMm: 42,
        ligamentMm: 4.2,
        axialMm: 1300,
      },
    ],
  },
  {
    reportNo: 'BW-22-090',
    tag: 'C-201',
    technique: 'PAUT',
    on: '2022-10-18',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 2.4,
        lengthMm: 55,
        axialMm: 4204,
        circumferentialMm: 1370,
      },
    ],
  },
  {
    reportNo: 'BW-22-101',
    tag: 'R-401',
    technique: 'PAUT',
    on: '2022-11-14',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 5.2,
        lengthMm: 60,
        axialMm: 1252,
        circumferentialMm: 2380,
      },
    ],
  },
  {
    reportNo: 'BW-22-103',
    tag: 'R-403',
    technique: 'PAUT',
    on: '2022-11-15',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        kind: 'corner',
        heightMm: 3.5,
        lengthMm: 3.5,
        remarks: 'Nozzle N1 inner corner',
      },
    ],
  },
  {
    reportNo: 'BW-23-040',
    tag: 'B-301',
    technique: 'PAUT',
    on: '2023-05-09',
    findings: [{ flaw: 'F01', orientation: axial, heightMm: 1.5, lengthMm: 18 }],
  },
  {
    reportNo: 'BW-23-044',
    tag: 'D-302',
    technique: 'TOFD',
    on: '2023-05-11',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 1.8, lengthMm: 60, circumferentialMm: 3118 },
    ],
  },
  {
    reportNo: 'BW-24-021',
    tag: 'V-404',
    technique: 'TOFD',
    on: '2024-03-12',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        orientation: axial,
        heightMm: 3.6,
        lengthMm: 31,
        axialMm: 1213,
      },
    ],
  },
  {
    reportNo: 'BW-24-048',
    tag: 'R-101',
    technique: 'TOFD',
    on: '2024-05-11',
    findings: [
      {
        flaw: 'F01',
        type: 'slag',
        kind: 'embedded',
        orientation: around,
        heightMm: 3.6,
        lengthMm: 26,
        ligamentMm: 31.5,
        circumferentialMm: 2362,
      },
    ],
  },
  {
    reportNo: 'BW-24-050',
    tag: 'V-103',
    technique: 'UT',
    on: '2024-05-12',
    findings: [
      {
        flaw: 'F01',
        type: 'lamination',
        kind: 'embedded',
        orientation: axial,
        heightMm: 2,
        lengthMm: 180,
        ligamentMm: 29,
        remarks: 'Laminar group 180 by 140 mm at mid-wall',
      },
    ],
  },
  {
    reportNo: 'BW-24-053',
    tag: 'E-106',
    technique: 'PAUT',
    on: '2024-05-16',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 2.4,
        lengthMm: 39.1,
        remarks:
          'Two flaws 2.0 by 18 and 2.4 by 20 mm, gap 1.1 mm, reported as one: gap at most half the deeper depth',
      },
    ],
  },
  {
    reportNo: 'BW-24-055',
    tag: 'V-104',
    technique: 'TOFD',
    on: '2024-05-18',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 1.9,
        lengthMm: 17,
        axialMm: 2042,
        remarks: 'Resolved as two where one was reported in 2022',
      },
      { flaw: 'F02', orientation: axial, heightMm: 1.6, lengthMm: 15, axialMm: 2070 },
    ],
  },
  { reportNo: 'BW-24-061', tag: 'V-405', technique: 'PAUT', on: '2024-06-11', findings: [] },
  {
    reportNo: 'BW-24-083',
    tag: 'E-504',
    technique: 'PAUT',
    on: '2024-09-03',
    findings: [
      {
        flaw: 'F01',
        face: 'outside',
        orientation: axial,
        heightMm: 1.5,
        lengthMm: 15,
        axialMm: 820,
        remarks: 'Branched; sizing unreliable',
      },
    ],
  },
  {
    reportNo: 'BW-24-085',
    tag: 'A-406',
    technique: 'TOFD',
    on: '2024-09-10',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        kind: 'embedded',
        orientation: axial,
        heightMm: 6,
        lengthMm: 43,
        ligamentMm: 4,
        axialMm: 1301,
      },
    ],
  },
  {
    reportNo: 'BW-24-086',
    tag: 'A-407',
    technique: 'TOFD',
    on: '2024-09-11',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        kind: 'embedded',
        orientation: axial,
        heightMm: 3,
        lengthMm: 20,
        ligamentMm: 18,
        axialMm: 3340,
      },
    ],
  },
  {
    reportNo: 'BW-24-094',
    tag: 'C-201',
    technique: 'PAUT',
    on: '2024-10-15',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 3.7,
        lengthMm: 64,
        axialMm: 4207,
        circumferentialMm: 1371,
      },
    ],
  },
  {
    reportNo: 'BW-24-095',
    tag: 'L-204',
    technique: 'PAUT',
    on: '2024-10-16',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 2.2, lengthMm: 30, circumferentialMm: 410 },
    ],
  },
  {
    reportNo: 'BW-24-101',
    tag: 'L-304',
    technique: 'PAUT',
    on: '2024-11-05',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 1.6, lengthMm: 18, circumferentialMm: 130 },
    ],
  },
  {
    reportNo: 'BW-24-104',
    tag: 'R-401',
    technique: 'PAUT',
    on: '2024-11-12',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 6.3,
        lengthMm: 66,
        axialMm: 1251,
        circumferentialMm: 2380,
      },
    ],
  },
  {
    reportNo: 'BW-24-105',
    tag: 'R-402',
    technique: 'UT',
    on: '2024-11-13',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 6,
        lengthMm: 80,
        axialMm: 2210,
        circumferentialMm: 2380,
      },
    ],
  },
  {
    reportNo: 'BW-24-106',
    tag: 'R-403',
    technique: 'PAUT',
    on: '2024-11-14',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        kind: 'corner',
        heightMm: 4.3,
        lengthMm: 4.3,
        remarks: 'Nozzle N1 inner corner',
      },
    ],
  },
  {
    reportNo: 'BW-25-038',
    tag: 'B-301',
    technique: 'PAUT',
    on: '2025-05-13',
    findings: [{ flaw: 'F01', orientation: axial, heightMm: 1.8, lengthMm: 20 }],
  },
  {
    reportNo: 'BW-25-039',
    tag: 'D-302',
    technique: 'TOFD',
    on: '2025-05-14',
    findings: [
      {
        flaw: 'F01',
        orientation: around,
        heightMm: 2.4,
        lengthMm: 85,
        circumferentialMm: 3116,
        remarks: 'Length has doubled since 2021',
      },
    ],
  },
  {
    reportNo: 'BW-25-041',
    tag: 'H-303',
    technique: 'PAUT',
    on: '2025-05-15',
    findings: [
      {
        flaw: 'F01',
        face: 'outside',
        orientation: around,
        heightMm: 4,
        lengthMm: 30,
        remarks: 'Toe indication outside; service temperature 515 °C',
      },
    ],
  },
  {
    reportNo: 'BW-25-070',
    tag: 'T-501',
    technique: 'PAUT',
    on: '2025-08-19',
    findings: [{ flaw: 'F01', face: 'outside', orientation: around, heightMm: 2.2, lengthMm: 36 }],
  },
  {
    reportNo: 'BW-25-081',
    tag: 'F-503',
    technique: 'PAUT',
    on: '2025-10-07',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        kind: 'corner',
        heightMm: 1.8,
        lengthMm: 1.8,
        remarks: 'Corner of the 40 mm hole',
      },
    ],
  },
  {
    reportNo: 'BW-26-019',
    tag: 'V-404',
    technique: 'TOFD',
    on: '2026-03-10',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        orientation: axial,
        heightMm: 3.9,
        lengthMm: 33,
        axialMm: 1212,
      },
    ],
  },
  {
    reportNo: 'BW-26-088',
    tag: 'V-502',
    technique: 'PAUT',
    on: '2026-08-25',
    findings: [{ flaw: 'F01', orientation: axial, heightMm: 4, lengthMm: 40, axialMm: 1180 }],
  },
  {
    reportNo: 'BW-26-092',
    tag: 'E-504',
    technique: 'PAUT',
    on: '2026-09-01',
    findings: [
      {
        flaw: 'F01',
        face: 'outside',
        orientation: axial,
        heightMm: 2.6,
        lengthMm: 24,
        axialMm: 822,
        remarks: 'Branched; sizing unreliable',
      },
    ],
  },
  {
    reportNo: 'BW-26-097',
    tag: 'A-406',
    technique: 'TOFD',
    on: '2026-09-08',
    findings: [
      {
        flaw: 'F01',
        type: 'lack of fusion',
        kind: 'embedded',
        orientation: axial,
        heightMm: 6.5,
        lengthMm: 44,
        ligamentMm: 3.75,
        axialMm: 1300,
      },
    ],
  },
  {
    reportNo: 'BW-26-118',
    tag: 'C-201',
    technique: 'PAUT',
    on: '2026-10-20',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 5.2,
        lengthMm: 78,
        axialMm: 4210,
        circumferentialMm: 1372,
        remarks: 'Branched tip; heat-affected zone',
      },
    ],
  },
  {
    reportNo: 'BW-26-119',
    tag: 'L-204',
    technique: 'PAUT',
    on: '2026-10-21',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 3.1, lengthMm: 40, circumferentialMm: 412 },
    ],
  },
  {
    reportNo: 'BW-26-126',
    tag: 'L-304',
    technique: 'PAUT',
    on: '2026-11-03',
    findings: [
      { flaw: 'F01', orientation: around, heightMm: 2.6, lengthMm: 27, circumferentialMm: 131 },
    ],
  },
  {
    reportNo: 'BW-26-131',
    tag: 'R-401',
    technique: 'PAUT',
    on: '2026-11-10',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 7.6,
        lengthMm: 74,
        axialMm: 1250,
        circumferentialMm: 2380,
      },
    ],
  },
  {
    reportNo: 'BW-26-132',
    tag: 'R-403',
    technique: 'PAUT',
    on: '2026-11-11',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        kind: 'corner',
        heightMm: 5.2,
        lengthMm: 5.2,
        remarks: 'Nozzle N1 inner corner',
      },
    ],
  },
  {
    reportNo: 'BW-26-137',
    tag: 'R-402',
    technique: 'PAUT',
    on: '2026-11-24',
    findings: [
      {
        flaw: 'F01',
        orientation: axial,
        heightMm: 12,
        lengthMm: 130,
        axialMm: 2208,
        circumferentialMm: 2380,
      },
    ],
  },
];
