import { tensileBelowRoom, yieldBelowRoom } from '../strength/strength-at-temperature';
import {
  charpyLowerBoundMPaSqrtM,
  robertsNewtonMPaSqrtM,
  sailorsCortenMPaSqrtM,
  shelfAtTearingMPaSqrtM,
  upperShelfMPaSqrtM,
} from './charpy';
import { kFromCtod } from './from-fracture-test';
import { masterCurveBoundMPaSqrtM, masterCurveFractileMPaSqrtM } from './master-curve';
import {
  arrestCurveMPaSqrtM,
  exemptionCurveMPaSqrtM,
  initiationCurveMetricMPaSqrtM,
  initiationCurveMPaSqrtM,
} from './reference-curves';
import { toughnessFractile, toughnessProbability } from './weibull-toughness';

// every value below is from its own evaluation of the published formula with 40 digits
const near = (value: number, expected: number) =>
  expect(Math.abs(value / expected - 1)).toBeLessThan(1e-12);

// Cv, B, lower bound
const CHARPY = [
  [10, 10, 42.56757513236433],
  [10, 25, 37.94733192202055],
  [10, 80, 33.41876045788307],
  [27, 10, 69.58],
  [27, 25, 62.353829072479584],
  [27, 80, 51.66687334179212],
  [60, 10, 87.4],
  [60, 25, 87.4],
  [60, 80, 74.54404330508393],
  [120, 10, 119.8],
  [120, 25, 119.8],
  [120, 80, 103.33086324531419],
  [200, 10, 163.0],
  [200, 25, 163.0],
  [200, 80, 131.9310638006555],
] as const;

// Cv, σY, by yield, at tearing
const SHELF = [
  [60, 300, 104.61357464497617, 111.1825160416977],
  [100, 450, 165.84329953302304, 147.7396078900368],
  [150, 350, 181.15186998758804, 184.36046970726184],
  [250, 600, 306.09802351534387, 242.23197622599528],
] as const;

// Cv, Sailors and Corten, Roberts and Newton
const OTHER_CHARPY = [
  [10, 46.16925383845834, 36.1312852424949],
  [27, 75.86382537151682, 67.55267975087689],
  [50, 103.23759005323593, 99.59430677703799],
  [70, 122.15236387397503, 123.11052278717538],
] as const;

// T − T0, P, K
const FRACTILES = [
  [-50, 0.01, 32.91166773802472],
  [-50, 0.05, 39.40672921786889],
  [-50, 0.5, 57.20862000276364],
  [-50, 0.95, 73.64916258907179],
  [-20, 0.01, 40.155498897443145],
  [-20, 0.05, 50.29448381805822],
  [-20, 0.5, 78.08376691978098],
  [-20, 0.95, 103.74794483196719],
  [0, 0.01, 47.86299620968917],
  [0, 0.05, 61.879146335798474],
  [0, 0.5, 100.2950989089945],
  [0, 0.95, 135.77330242707987],
  [25, 0.01, 62.6864563296748],
  [25, 0.05, 84.15937244270486],
  [25, 0.5, 143.01308901853912],
  [25, 0.95, 197.36613754687468],
  [50, 0.01, 86.52279065847598],
  [50, 0.05, 119.98629234580375],
  [50, 0.5, 211.70422360274415],
  [50, 0.95, 296.4082908829057],
] as const;

// T, T0, B, P, Tk, K
const BOUNDS = [
  [0, -40, 12, 0.05, 25, 84.83149165823089],
  [0, -40, 40, 0.05, 0, 94.32356866637559],
  [0, -40, 100, 0.2, 14, 86.67456950376813],
  [-20, -10, 12, 0.05, 25, 48.929924604140346],
  [-20, -10, 40, 0.05, 0, 51.59841848815502],
  [-20, -10, 100, 0.2, 14, 49.06423461863463],
  [40, 20, 12, 0.05, 25, 66.32402377006011],
  [40, 20, 40, 0.05, 0, 72.2985037507037],
  [40, 20, 100, 0.2, 14, 67.28622180013639],
] as const;

// T − RTNDT, KIc, KIc of SI constants, KIa, exemption curve
const CURVES = [
  [-100, 37.10413187640167, 37.12251636851666, 30.45459841716792, 37.104122611250936],
  [-50, 40.247678166727454, 40.26600457035241, 33.157319151387206, 40.24762211583182],
  [-20, 47.57148557798116, 47.58967664753603, 37.56289390313608, 47.571320526054954],
  [0, 59.26502501126158, 59.283, 43.12411292629808, 59.26468592310292],
  [20, 83.2886207729668, 83.3061518380997, 52.496964058340716, 83.2879241389923],
  [40, 132.64349374489774, 132.66011279863247, 68.29392116028971, 132.64206255692486],
  [60, 219.76869882175097, 219.76869882175097, 94.91803480141114, 219.76869882175097],
  [100, 219.76869882175097, 219.76869882175097, 215.41748500396892, 219.76869882175097],
] as const;

// K, K0, probability
const WEIBULL = [
  [30, 100, 0.00024411082510278348],
  [60, 120, 0.025275098398206058],
  [100, 108, 0.49490737736446416],
  [150, 160, 0.5245370243454995],
  [90, 300, 0.00389863052988251],
] as const;

// δ, σY, σU, K of CTOD [MPa·√mm]
const SPECIMENS = [
  [0.05, 300, 450, 2427.011550362011],
  [0.15, 420, 540, 4853.16626517751],
  [0.4, 250, 430, 6404.725210023471],
  [1, 500, 620, 13593.57493936718],
] as const;

// strengths at 20 °C, T, yield, tensile
const COLD = [
  [250, 420, -20, 280.7802197802198, 444.4142132412986],
  [350, 500, -60, 422.0966057441253, 565.0462000091673],
  [450, 600, -120, 624.6363636363636, 765.1206814454525],
  [550, 650, -196, 1084.589001447178, 1007.3970901465829],
] as const;
describe('toughness and strength against an evaluation with 40 digits', () => {
  it.each(CHARPY)('lower bound of %d J in %d mm', (energy, thickness, k) => {
    near(charpyLowerBoundMPaSqrtM(energy, thickness), k);
  });

  it.each(SHELF)('upper shelf of %d J, σY %d', (energy, yields, byYield, atTearing) => {
    near(upperShelfMPaSqrtM(energy, yields), byYield);
    near(shelfAtTearingMPaSqrtM(energy, 207_000, 0.3), atTearing);
  });

  it.each(OTHER_CHARPY)('other forms of %d J', (energy, mean, bound) => {
    near(sailorsCortenMPaSqrtM(energy), mean);
    near(robertsNewtonMPaSqrtM(energy), bound);
  });

  it.each(FRACTILES)('master curve %d °C from T0, fractile %d', (above, p, k) => {
    near(masterCurveFractileMPaSqrtM(above, 0, p), k);
  });

  it.each(BOUNDS)('bound at %d °C, T0 %d, B %d, P %d, Tk %d', (t, t0, b, p, allowance, k) => {
    const options = { t0C: t0, thicknessMm: b, probability: p, allowanceC: allowance };
    near(masterCurveBoundMPaSqrtM(t, options), k);
  });

  it.each(CURVES)('curves %d °C from the reference', (above, us, si, arrest, exemption) => {
    near(initiationCurveMPaSqrtM(above), us);
    near(initiationCurveMetricMPaSqrtM(above), si);
    near(arrestCurveMPaSqrtM(above), arrest);
    near(exemptionCurveMPaSqrtM(above), exemption);
  });

  it.each(WEIBULL)('probability of less than %d, K0 %d', (k, scale, probability) => {
    near(toughnessProbability(k, scale), probability);
    near(toughnessFractile(probability, scale), k);
  });

  it.each(SPECIMENS)('CTOD %d, σY %d, σU %d', (ctod, yieldMPa, tensileMPa, k) => {
    const material = { yieldMPa, tensileMPa, youngsModulusMPa: 207_000, poissonsRatio: 0.3 };
    near(kFromCtod(ctod, material), k);
  });

  it.each(COLD)('strength %d/%d at %d °C', (yields, tensile, t, coldYield, coldTensile) => {
    near(yieldBelowRoom(yields, t), coldYield);
    near(tensileBelowRoom(tensile, t), coldTensile);
  });
});
