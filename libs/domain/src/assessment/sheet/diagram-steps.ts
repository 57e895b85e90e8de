import { chi } from '../../fracture/fad/interaction';
import { toMPaSqrtM } from '../../units/convert';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';
import { stepIn } from './step-in';

const DEFINITION = 'BS 7910, R6: definition';
const FORMULAS: Readonly<Record<string, string>> = {
  'option-1': '(1 + Lr²/2)^−½ [0.3 + 0.7 exp(−μ Lr⁶)] to Lr = 1, then f(1) Lr^((N−1)/(2N))',
  'option-1-plateau': '(1 + Lr²/2)^−½ below Lr = 1 (yield plateau)',
  'option-2': '[E ε/(Lr σY) + Lr³ σY/(2 E ε)]^−½, ε at the true stress Lr σY',
};
const CUT_OFFS: Readonly<Record<string, string>> = {
  'option-1-plateau': '1 (yield plateau)',
  'option-2': '(σY + σU)/(2 σY), or where the curve ends',
};
const INTERACTION =
  '0.1 χ^0.714 − 0.007 χ² + 3·10⁻⁵ χ⁵ to Lr = 0.8, then falling to 0 at 1.05; χ = KIs Lr/KIp';

const step = stepIn('Failure assessment diagram');
const lrText = ({ point }: SheetSubject) => `Lr = ${number(point.lr)}`;

/** The point on the diagram, the line above it and the reserves. */
export const diagramSteps = (subject: SheetSubject): CalculationStep[] => [
  ...pointSteps(subject),
  ...lineSteps(subject),
  ...reserveSteps(subject),
];

function pointSteps(subject: SheetSubject): CalculationStep[] {
  const { section, point } = subject;
  const { kPrimary, kSecondary, rho } = point.at;
  const weight = number(chi(kPrimary, kSecondary, point.lr));
  const inputs = [
    `KIp = ${number(toMPaSqrtM(kPrimary))} MPa·√m`,
    `KIs = ${number(toMPaSqrtM(kSecondary))} MPa·√m`,
    `Kmat = ${number(toMPaSqrtM(section.flaw.toughness))} MPa·√m`,
    `ρ = ${number(rho)}`,
  ];
  return [
    step('ρ', 'Interaction of secondary with primary stress', rho, '', {
      formula: INTERACTION,
      source: 'JCSS Probabilistic Model Code 3.12; BS 7910 (from memory)',
      inputs: [`χ = ${weight}`, lrText(subject)],
    }),
    step('Kr', 'Fracture ratio', point.kr, '', {
      formula: '(KIp + KIs)/Kmat + ρ',
      source: DEFINITION,
      inputs,
    }),
  ];
}

function lineSteps(subject: SheetSubject): CalculationStep[] {
  const { section, point } = subject;
  const { line } = section.flaw;
  const { yieldMPa, tensileMPa, youngsModulusMPa } = section.flaw.material;
  const strengths = [`σY = ${number(yieldMPa)} MPa`, `σU = ${number(tensileMPa)} MPa`];
  return [
    step('f(Lr)', `Line of the diagram: ${line.title}`, point.line, '', {
      formula: FORMULAS[line.key] ?? line.title,
      source: line.source,
      inputs: [lrText(subject), ...strengths, `E = ${number(youngsModulusMPa)} MPa`],
    }),
    step('Lr,max', 'Cut-off', section.evaluator.lrMax, '', {
      formula: CUT_OFFS[line.key] ?? '(σY + σU)/(2 σY)',
      source: line.source,
      inputs: strengths,
    }),
  ];
}

function reserveSteps(subject: SheetSubject): CalculationStep[] {
  const { point } = subject;
  return [
    step('FL', 'Reserve factor on load', point.reserveOnLoad, '', {
      formula:
        'first factor on primary load that reaches the line; ρ evaluated again at every trial',
      source: DEFINITION,
      inputs: [lrText(subject), `Kr = ${number(point.kr)}`],
    }),
    step('FK', 'Reserve factor on toughness', point.reserveOnToughness ?? 'collapse governs', '', {
      formula: 'Kmat (f(Lr) − ρ)/(KIp + KIs), least over the front',
      source: 'algebra of the definition of Kr',
      inputs: [`f(Lr) = ${number(point.line)}`],
    }),
    limitingStep(subject),
  ];
}

function limitingStep({ flaw, limiting }: SheetSubject): CalculationStep {
  const byLength = limiting.lengthMm !== null;
  return step(
    byLength ? 'llim' : 'hlim',
    byLength ? 'Limiting length' : 'Limiting through-wall extent at this length',
    limiting.heightMm ?? limiting.lengthMm ?? 'none',
    'mm',
    {
      formula: 'first size that reaches the line, the other extent unchanged',
      source: limiting.because,
      inputs: [`a = ${number(flaw.a)} mm`, `c = ${number(flaw.c)} mm`],
    },
  );
}
