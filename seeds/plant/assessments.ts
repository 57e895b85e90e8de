import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';

/** What is special about the assessment of one flaw on one finding; all others go straight to approval. */
export interface DemoAssessment {
  /** Flaw and day of the finding, e.g. `C-201-F01 2026-10-20`. */
  readonly key: string;
  /** How far it got. */
  readonly until: 'draft' | 'submitted' | 'approved';
  /** Changes of the prefilled inputs. */
  readonly change?: (input: AssessmentInput) => AssessmentInput;
  readonly conclusion?: string;
  /** Returned once with this reason, then changed and sent again. */
  readonly returned?: {
    readonly reason: string;
    readonly change: (input: AssessmentInput) => AssessmentInput;
  };
  /** A second assessment on the same finding, some days later. */
  readonly then?: Omit<DemoAssessment, 'key'>;
}

const withRate =
  (depth: number, note: string, provenance: 'assumed' | 'measured') =>
  (input: AssessmentInput): AssessmentInput => ({
    ...input,
    growth: {
      ...input.growth,
      stressCorrosion: {
        depthRateMmPerYear: { value: depth, provenance, note },
        endRateMmPerYear: { value: depth, provenance, note },
      },
    },
  });

const withToughness =
  (value: number, note: string) =>
  (input: AssessmentInput): AssessmentInput => ({
    ...input,
    material: { ...input.material, toughnessMPaSqrtM: { value, provenance: 'certificate', note } },
  });

const withBendingNote = (input: AssessmentInput): AssessmentInput => ({
  ...input,
  stress: {
    ...input.stress,
    primaryBendingMPa: {
      ...input.stress.primaryBendingMPa,
      note: 'Peaking of 6 mm measured by template in 2022, hand calculation HC-401',
    },
  },
});

export const ASSESSMENTS: readonly DemoAssessment[] = [
  {
    key: 'C-201-F01 2022-10-18',
    until: 'approved',
    change: withRate(0.3, 'Rate assumed from the corrosion review of 2021', 'assumed'),
  },
  {
    key: 'C-201-F01 2026-10-20',
    until: 'approved',
    change: withRate(0.7, 'Mean rate of the findings of 2022, 2024 and 2026', 'measured'),
    returned: {
      reason:
        '1. The mean rate is used; use the upper 95 % bound of the measured rate. 2. Say why the rate of 2022 was too low.',
      change: withRate(
        1.11,
        'Upper 95 % bound of the rate measured in 2022, 2024 and 2026',
        'measured',
      ),
    },
    conclusion:
      'Acceptable until the re-inspection, at the upper bound of the measured rate. Growth is faster than assumed in 2022; the amine chemistry is under review.',
  },
  {
    key: 'L-204-F01 2024-10-16',
    until: 'approved',
    change: withRate(0.45, 'Rate of the neighbouring line, inspection programme 2023', 'assumed'),
  },
  {
    key: 'E-504-F01 2024-09-03',
    until: 'approved',
    change: withRate(
      0.55,
      'Rate assumed for chloride cracking under insulation; sizing of branched cracks is unreliable',
      'assumed',
    ),
  },
  { key: 'E-504-F01 2026-09-01', until: 'draft' },
  {
    key: 'L-304-F01 2026-11-03',
    until: 'submitted',
    conclusion: 'Acceptable until the tee is replaced in TA-27 under temporary measure TM-044.',
  },
  {
    key: 'R-401-F01 2026-11-10',
    until: 'approved',
    change: withBendingNote,
    conclusion:
      'Acceptable until the re-inspection at the present pressure and cycles. Near the limit: no higher pressure, no more cycles.',
  },
  {
    key: 'R-402-F01 2026-11-24',
    until: 'approved',
    conclusion:
      'Not acceptable. Out of service until excavated, weld repaired, heat treated and inspected anew.',
  },
  {
    key: 'V-502-F01 2026-08-25',
    until: 'approved',
    change: withToughness(45, 'At the lowest metal temperature of -20 °C, certificate B7702'),
    conclusion: 'Not acceptable at a metal temperature of -20 °C.',
    then: {
      until: 'approved',
      change: withToughness(75, 'At +5 °C and above, certificate B7702'),
      conclusion:
        'Acceptable with the minimum metal temperature raised to +5 °C under pressure; sign at the panel, acknowledged by operations.',
    },
  },
];

/** Findings outside what a crack-like assessment covers, and whom they were referred to. */
export const REFERRED: readonly { readonly flaw: string; readonly reason: string }[] = [
  {
    flaw: 'E-102-F01',
    reason:
      'Hydrogen attack suspected: referred to the corrosion specialist for a survey; temporary measure TM-031',
  },
  {
    flaw: 'V-103-F01',
    reason:
      'Laminar group at mid-wall: referred for a mapping grid by the rules for laminations and blisters',
  },
  { flaw: 'H-303-F01', reason: 'Creep range: referred for replicas and a creep life study' },
];

/** What the planner has put into windows. */
export const PLANS: readonly {
  readonly flaw: string;
  readonly window: string | null;
  readonly on: string;
  readonly note: string;
}[] = [
  { flaw: 'R-101-F01', window: 'TA-28', on: '2028-04-14', note: 'TOFD, scaffold at level 3' },
  { flaw: 'V-104-F01', window: 'TA-28', on: '2028-04-18', note: 'With V-103, same crew' },
  { flaw: 'E-106-F01', window: 'TA-28', on: '2028-04-20', note: '' },
  {
    flaw: 'C-201-F01',
    window: 'TA-27',
    on: '2027-05-06',
    note: 'Entry permit, local heat treatment decision',
  },
  {
    flaw: 'D-302-F01',
    window: 'TA-27',
    on: '2027-05-05',
    note: 'Blend-grind, MT and TOFD in the first days',
  },
  { flaw: 'L-204-F01', window: 'TA-27', on: '2027-05-10', note: 'Spool to be replaced' },
  { flaw: 'A-406-F01', window: null, on: '2028-03-07', note: 'TOFD from outside, on-stream' },
];
