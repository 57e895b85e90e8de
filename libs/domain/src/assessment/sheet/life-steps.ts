import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { timeLawOf } from '../drivers';
import { number } from '../number-text';

const GROUP = 'Growth and remaining life';

/** The laws the flaw was grown by, and how long it lasts. */
export function lifeSteps({ input, life }: SheetSubject): CalculationStep[] {
  const { fatigue, stressCorrosion, withTime, thinning } = input.growth;
  const steps: CalculationStep[] = [];
  if (fatigue) {
    steps.push({
      group: GROUP,
      symbol: 'da/dN',
      name: `Fatigue: ${fatigue.law.title}`,
      value: fatigue.law.published
        ? fatigue.law.key
        : fatigue.law.stages
            .map((s) => `${s.coefficient.toExponential()} ΔK^${s.exponent}`)
            .join(' | '),
      unit: 'mm/cycle',
      formula: fatigue.law.published
        ? 'published form, each block by its own ΔK and R; depth and length each by its own K'
        : `A ΔK^m above ΔK0 = ${number(fatigue.law.thresholdMPaSqrtMm)} MPa·√mm, each block by its own ΔK; depth and length each by its own K`,
      source: fatigue.law.source,
      inputs: fatigue.blocks.map(
        (b) =>
          `Δσm = ${number(b.membraneRangeMPa)} MPa, Δσb = ${number(b.bendingRangeMPa)} MPa, ${number(b.cyclesPerYear)} per year${typeof b.stressRatio === 'number' ? `, R = ${number(b.stressRatio)}` : ''}`,
      ),
    });
  }
  if (stressCorrosion) {
    steps.push({
      group: GROUP,
      symbol: 'da/dt',
      name: 'Stress corrosion at constant rate',
      value: stressCorrosion.depthRateMmPerYear.value,
      unit: 'mm/year',
      formula: 'added to fatigue (Wei and Landes)',
      source: stressCorrosion.depthRateMmPerYear.note || 'Input',
      inputs: [`each end ${number(stressCorrosion.endRateMmPerYear.value)} mm/year`],
    });
  }
  const timeLaw = withTime ? timeLawOf(withTime.law) : undefined;
  if (withTime && timeLaw) {
    steps.push({
      group: GROUP,
      symbol: 'da/dt',
      name: `Growth with time by K: ${timeLaw.title}`,
      value: timeLaw.key,
      unit: 'mm/year',
      formula: 'by K of primary and secondary stress at each point; added to fatigue',
      source: timeLaw.source,
      inputs: [`T = ${number(withTime.temperatureC.value)} °C`],
    });
  }
  if (thinning) {
    steps.push({
      group: GROUP,
      symbol: 'r',
      name: `Corrosion of the ${thinning.face} face`,
      value: thinning.rateMmPerYear.value,
      unit: 'mm/year',
      formula: 'B = B0 − r t; membrane stress times B0/B, with bending its square',
      source: 'equilibrium',
      inputs: [],
    });
  }
  steps.push({
    group: GROUP,
    symbol: 'T',
    name: `Remaining life: ${life.because}`,
    value: life.years ?? 'none',
    unit: life.years === null ? '' : 'years',
    formula: 'growth integrated in the logarithm of the size to the limit, rounded down',
    source: 'Dormand and Prince 1980, error-controlled; end found by stepping again onto the limit',
    inputs: [`horizon = ${number(input.horizonYears)} years`],
  });
  return steps;
}
