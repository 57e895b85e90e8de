import { assessFlaw } from '../assess-flaw';
import type { AssessmentInput } from '../assessment-input';
import type { RefusedFlaw } from '../assessment-outcome';
import { drivers, type Driver } from './sensitivity-drivers';

/** What the assessment answers with one input changed; null where the method then gives no verdict. */
export interface Shifted {
  /** The changed value, in the unit of the input. */
  readonly value: number;
  readonly reserveOnLoad: number | null;
  /** Remaining life [years]; null where there is none. */
  readonly years: number | null;
}

/** One input moved down and up by a plausible amount, all else as it is. */
export interface SensitivityRow {
  readonly name: string;
  readonly unit: string;
  /** By how much and why that much. */
  readonly change: string;
  readonly value: number;
  readonly low: Shifted;
  readonly high: Shifted;
}

/** How far each input moves the verdict, the strongest first. */
export interface Sensitivity {
  readonly status: 'found';
  readonly reserveOnLoad: number;
  readonly years: number | null;
  readonly rows: readonly SensitivityRow[];
}

/**
 * Assesses the flaw again with one input at a time changed: which of them the verdict and the life hang on.
 * Every run is a whole assessment by the same path, so growth and limits follow.
 */
export function sensitivity(input: AssessmentInput): Sensitivity | RefusedFlaw {
  const base = assessFlaw(input);
  if (base.status === 'refused') return base;
  const rows = drivers(input).map((driver) => rowOf(input, driver));
  return {
    status: 'found',
    reserveOnLoad: base.reserveOnLoad,
    years: base.life.years,
    rows: rows.sort((x, y) => swing(y) - swing(x) || x.name.localeCompare(y.name)),
  };
}

function rowOf(input: AssessmentInput, driver: Driver): SensitivityRow {
  const at = (value: number): Shifted => {
    const outcome = assessFlaw(driver.set(input, value));
    return outcome.status === 'refused'
      ? { value, reserveOnLoad: null, years: null }
      : { value, reserveOnLoad: outcome.reserveOnLoad, years: outcome.life.years };
  };
  const { name, unit, change, value, low, high } = driver;
  return { name, unit, change, value, low: at(low), high: at(high) };
}

/** Relative swing of the reserve on load, and of the life; a lost verdict counts as the whole of it. */
function swing({ low, high }: SensitivityRow): number {
  const spread = (x: number | null, y: number | null) => {
    if (x === null && y === null) return 0;
    const [a, b] = [x ?? 0, y ?? 0];
    return Math.abs(a - b) / Math.max(Math.abs(a), Math.abs(b), 1e-9);
  };
  return Math.max(spread(low.reserveOnLoad, high.reserveOnLoad), spread(low.years, high.years));
}
