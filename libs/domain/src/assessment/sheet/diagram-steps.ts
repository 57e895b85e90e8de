import { chi } from '../../fracture/fad/interaction';
import { toMPaSqrtM } from '../../units/convert';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';

const OPTION_1 = 'BS 7910:2013 7.3.3, Option 1 (from memory)';

/** The point on the diagram, the line above it and the reserves. */
export function diagramSteps({ section, flaw, point, limiting }: SheetSubject): CalculationStep[] {
  const { material, toughness } = section.flaw;
  const { kPrimary, kSecondary, rho } = point.at;
  const [ki, ks] = [number(toMPaSqrtM(kPrimary)), number(toMPaSqrtM(kSecondary))];
  const lr = `Lr = ${number(point.lr)}`;
  const step = (
    symbol: string,
    name: string,
    value: number | string,
    formula: string,
    source: string,
    inputs: readonly string[],
    unit = '',
  ): CalculationStep => ({
    group: 'Failure assessment diagram',
    symbol,
    name,
    value,
    unit,
    formula,
    source,
    inputs,
  });
  const strengths = [
    `σY = ${number(material.yieldMPa)} MPa`,
    `σU = ${number(material.tensileMPa)} MPa`,
  ];
  const line = material.yieldPlateau
    ? '(1 + Lr²/2)^−½ below Lr = 1 (yield plateau)'
    : '(1 + Lr²/2)^−½ [0.3 + 0.7 exp(−μ Lr⁶)] to Lr = 1, then f(1) Lr^((N−1)/(2N))';
  const weight = chi(kPrimary, kSecondary, point.lr);
  return [
    step(
      'ρ',
      'Interaction of secondary with primary stress',
      rho,
      '0.1 χ^0.714 − 0.007 χ² + 3·10⁻⁵ χ⁵ to Lr = 0.8, then falling to 0 at 1.05; χ = KIs Lr/KIp',
      'JCSS Probabilistic Model Code 3.12; BS 7910 (from memory)',
      [`χ = ${number(weight)}`, lr],
    ),
    step('Kr', 'Fracture ratio', point.kr, '(KIp + KIs)/Kmat + ρ', 'BS 7910, R6', [
      `KIp = ${ki} MPa·√m`,
      `KIs = ${ks} MPa·√m`,
      `Kmat = ${number(toMPaSqrtM(toughness))} MPa·√m`,
      `ρ = ${number(rho)}`,
    ]),
    step('f(Lr)', 'Line of the diagram', point.line, line, OPTION_1, [
      lr,
      ...strengths,
      `E = ${number(material.youngsModulusMPa)} MPa`,
    ]),
    step(
      'Lr,max',
      'Cut-off',
      section.evaluator.lrMax,
      material.yieldPlateau ? '1 (yield plateau)' : '(σY + σU)/(2 σY)',
      OPTION_1,
      strengths,
    ),
    step(
      'FL',
      'Reserve factor on load',
      point.reserveOnLoad,
      'first factor on primary load that reaches the line; ρ evaluated again at every trial',
      'BS 7910, R6: definition',
      [lr, `Kr = ${number(point.kr)}`],
    ),
    step(
      'FK',
      'Reserve factor on toughness',
      point.reserveOnToughness ?? 'collapse governs',
      'Kmat (f(Lr) − ρ)/(KIp + KIs), least over the front',
      'algebra of the definition of Kr',
      [`f(Lr) = ${number(point.line)}`],
    ),
    step(
      'alim',
      'Limiting through-wall extent at this length',
      limiting.heightMm ?? 'none',
      'first height that reaches the line, length unchanged',
      limiting.because,
      [`c = ${number(flaw.c)} mm`],
      'mm',
    ),
  ];
}
