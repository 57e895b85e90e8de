import { chi, interaction } from '../fracture/fad/interaction';
import {
  continuousLine,
  lrMax,
  plateauLine,
  type DiagramMaterial,
} from '../fracture/fad/option-one';
import { reserveOnLoad } from '../fracture/fad/reserve-on-load';
import { heatTreatedResidual, relaxedResidual } from '../fracture/fad/residual-stress';
import type { CheckKind, CheckRow } from './check-row';

const BS = 'BS 7910:2013 7.3 (from memory; 40-digit evaluation)';
const JCSS = 'JCSS Probabilistic Model Code Part 3.12, equations 3.12 to 3.14';

const row = (
  id: string,
  quantity: string,
  published: number,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
  unit = '',
): CheckRow => ({
  id,
  group: 'Failure assessment diagram',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const OTHER: DiagramMaterial = {
  yieldMPa: 400,
  tensileMPa: 500,
  youngsModulusMPa: 200_000,
  yieldPlateau: false,
};

const LINE = [
  [0, 1],
  [0.2, 0.9901213085238844],
  [0.4, 0.9606206930560731],
  [0.8, 0.7828855121682547],
  [0.9, 0.6843724649296409],
  [1, 0.5613211239724346],
  [1.05, 0.4386192697650148],
  [1.1, 0.3466956293723572],
  [1.2, 0.2233089851165668],
] as const;

const line = LINE.map(([lr, f], i) =>
  row(
    `FL-${i + 1}`,
    `f(${lr}), continuous yielding, σY 350, σU 500`,
    f,
    1e-9,
    'from memory',
    BS,
    () => continuousLine(lr, STEEL),
  ),
);

/** Room to the line with K and Lr proportional to the factor. */
const room = (factor: number, kp: number, ks: number, kmat: number, lr: number) =>
  Math.min(
    continuousLine(factor * lr, STEEL) -
      (factor * kp + ks) / kmat -
      interaction(factor * kp, ks, factor * lr),
    lrMax(STEEL) - factor * lr,
  );

export const DIAGRAM_CHECKS: readonly CheckRow[] = [
  ...line,
  row('FD-1', 'cut-off Lr,max', 1.214285714285714, 1e-9, 'from memory', BS, () => lrMax(STEEL)),
  row(
    'FD-2',
    'f(1) = 1.5^−½ (0.3 + 0.7 e^−0.5), σY 400, E 200 000',
    0.5916101211965601,
    1e-9,
    'closed form',
    BS,
    () => continuousLine(1, OTHER),
  ),
  row('FD-3', 'f(0.5), yield plateau', 0.9428090415820635, 1e-9, 'closed form', BS, () =>
    plateauLine(0.5, STEEL),
  ),
  row('FD-4', 'f(1.1), yield plateau', 0.157142533290666, 1e-9, 'closed form', BS, () =>
    plateauLine(1.1, STEEL),
  ),
  row('FD-5', 'χ, KIp 100, KIs 100, Lr 0.5', 0.5, 1e-9, 'closed form', JCSS, () =>
    chi(100, 100, 0.5),
  ),
  row('FD-6', 'ρ, KIp 100, KIs 200, Lr 0.5', 0.09303, 1e-9, 'closed form', JCSS, () =>
    interaction(100, 200, 0.5),
  ),
  row('FD-7', 'ρ, KIp 100, KIs 400, Lr 0.5', 0.1369945822393453, 1e-9, 'closed form', JCSS, () =>
    interaction(100, 400, 0.5),
  ),
  row('FD-8', 'ρ, KIp 100, KIs 400, Lr 0.8', 0.1678305299456127, 1e-9, 'closed form', JCSS, () =>
    interaction(100, 400, 0.8),
  ),
  row('FD-9', 'ρ at Lr = 1.05', 0, 1e-9, 'closed form', JCSS, () => interaction(100, 100, 1.05)),
  row(
    'FD-10',
    'ρ of compressive secondary K',
    0,
    1e-9,
    'from memory',
    'BS 7910:2013 7.3.6 (from memory)',
    () => interaction(100, -50, 0.5),
  ),
  row(
    'FD-11',
    'Kr with ρ, KIp 60, KIs 40, Kmat 150, Lr 0.6',
    0.7175311102990201,
    1e-9,
    'closed form',
    JCSS,
    () => 100 / 150 + interaction(60, 40, 0.6),
  ),
  row(
    'FD-12',
    'as-welded residual at σref 150, capped at yield',
    350,
    1e-9,
    'from memory',
    BS,
    () => relaxedResidual(150, 350, 500),
    'MPa',
  ),
  row(
    'FD-13',
    'heat-treated residual, flaw transverse to the weld',
    105,
    1e-9,
    'from memory',
    BS,
    () => heatTreatedResidual('transverse', 350),
    'MPa',
  ),
  row(
    'FD-14',
    'heat-treated residual, flaw parallel to the weld',
    70,
    1e-9,
    'from memory',
    BS,
    () => heatTreatedResidual('parallel', 350),
    'MPa',
  ),
  row(
    'FD-15',
    'reserve on load, primary only, Lr 0.4, Kr 0.4',
    1.976631191521587,
    1e-9,
    'independent computation',
    'root on the radial line',
    () => reserveOnLoad((f) => room(f, 0.4, 0, 1, 0.4), lrMax(STEEL) / 0.4),
  ),
  row(
    'FD-16',
    'reserve on load with secondary, ρ renewed at every trial',
    1.59109582663889,
    1e-8,
    'independent computation',
    'root, primary scaled',
    () => reserveOnLoad((f) => room(f, 50, 40, 150, 0.45), lrMax(STEEL) / 0.45),
  ),
];
