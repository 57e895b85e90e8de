import { CODE_LAWS } from './code-laws';
import type { CrackLaw } from './crack-law';
import {
  ANY_RATIO,
  constantThreshold,
  LOWEST_RATIO,
  scope,
  STEEL_IN_AIR,
} from './crack-law-scopes';
import { GROWTH_LAWS, type LibraryLaw } from './growth-laws';
import { RATIO_LAWS } from './ratio-laws';
import { scaledByModulus } from './scaled-by-modulus';

/** Coldest sea water and 20 °C, what the marine laws were measured between. */
const SEA_WATER = [0, 20] as const;
const RATIOS = {
  'R < 0.5': { ratio: [LOWEST_RATIO, 0.4999], safeBelowRatio: false },
  'R ≥ 0.5': { ratio: [0.5, ANY_RATIO[1]], safeBelowRatio: true },
  any: {},
} as const;

const fromTable = (law: LibraryLaw): CrackLaw => ({
  form: 'stages',
  key: law.key,
  title: law.title,
  environment: law.environment,
  source: law.source,
  stages: law.stages,
  threshold: constantThreshold(law.thresholdMPaSqrtMm),
  scope: scope({
    ...RATIOS[law.stressRatio],
    temperature: law.environment === 'air' ? [-50, 100] : SEA_WATER,
  }),
});

const TABLE_LAWS = GROWTH_LAWS.map(fromTable);

/** Away from welds the threshold rises where the stress ratio is low. */
const parentMetal = TABLE_LAWS.filter(({ key }) => /^steel-air-(low|simplified)/.test(key)).map(
  (law): CrackLaw => ({
    ...law,
    key: `${law.key}-parent`,
    title: `${law.title}, parent metal, threshold by stress ratio`,
    threshold: STEEL_IN_AIR,
  }),
);

const SIMPLIFIED = TABLE_LAWS.filter(({ key }) => key === 'steel-air-simplified');

const STEEL_MODULUS = 207_000;
/** Young's moduli of other metals at 20 °C [MPa]; handbook values, common practice. */
const OTHER_METALS = [
  ['aluminium', 'Aluminium alloy', 70_000],
  ['titanium', 'Titanium alloy', 110_000],
  ['copper', 'Copper alloy', 120_000],
  ['nickel', 'Nickel alloy', 205_000],
] as const;

const otherMetals = SIMPLIFIED.flatMap((steel) =>
  OTHER_METALS.map(([key, title, modulus]): CrackLaw => ({
    ...scaledByModulus(steel, STEEL_MODULUS, modulus),
    key: `${key}-air-simplified`,
    title: `${title}, air, simplified, scaled from steel by modulus`,
  })),
);

/** Laws of every published form, each with its limits; mm/cycle with MPa·√mm. */
export const CRACK_LAW_LIBRARY: readonly CrackLaw[] = [
  ...TABLE_LAWS,
  ...parentMetal,
  ...otherMetals,
  ...CODE_LAWS,
  ...RATIO_LAWS,
];

/** The law of a key, or undefined when the library has none. */
export const crackLaw = (key: string): CrackLaw | undefined =>
  CRACK_LAW_LIBRARY.find((law) => law.key === key);
