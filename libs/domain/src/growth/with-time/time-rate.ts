import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import type { TimeLaw } from '../../materials/time-law';
import { arrhenius } from './arrhenius';

/** Growth with time [mm/year] from K [MPa·√mm]. */
export type RateWithTime = (stressIntensity: number) => number;

/** Growth with time by a law of any form at a temperature; for inner loops, limits are checked elsewhere. */
export function rateWithTime(law: TimeLaw, temperatureC: number): RateWithTime {
  const above = aboveThreshold(law, temperatureC);
  const { thresholdMPaSqrtMm } = law;
  return (k) => (k > 0 && k >= thresholdMPaSqrtMm ? above(k) : 0);
}

function aboveThreshold(law: TimeLaw, temperatureC: number): RateWithTime {
  switch (law.form) {
    case 'plateau':
      return () => law.rateMmPerYear;
    case 'power': {
      const most = law.plateauMmPerYear ?? Infinity;
      return (k) => Math.min(most, law.coefficient * k ** law.exponent);
    }
    case 'thermal': {
      const factor =
        law.coefficient * arrhenius(law.activationKJPerMol, temperatureC, law.referenceC);
      return (k) => factor * (k - law.thresholdMPaSqrtMm) ** law.exponent;
    }
  }
}

/** Growth in one year at a K, refused outside the limits of the law. */
export function evaluateTimeLaw(
  law: TimeLaw,
  at: { readonly stressIntensityMPaSqrtMm: number; readonly temperatureC: number },
): { readonly status: 'found'; readonly mmPerYear: number } | Refused {
  const [low, high] = law.stressIntensityMPaSqrtMm;
  const [cold, hot] = law.temperatureC;
  const broken = outOfBounds([
    {
      input: 'stressIntensityMPaSqrtMm',
      name: 'Stress intensity',
      unit: 'MPa·√mm',
      value: at.stressIntensityMPaSqrtMm,
      min: low,
      max: high,
      instead: `${law.title} was not measured there: take the plant's own rate.`,
    },
    {
      input: 'temperatureC',
      name: 'Temperature',
      unit: '°C',
      value: at.temperatureC,
      min: cold,
      max: hot,
      instead: `${law.title} is not for this temperature: take the plant's own rate.`,
    },
  ]);
  if (broken.length > 0) return refused(...broken);
  const mmPerYear = rateWithTime(law, at.temperatureC)(at.stressIntensityMPaSqrtMm);
  return { status: 'found', mmPerYear };
}
