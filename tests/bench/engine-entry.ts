/** What of the engine is measured: bundled as the product is, so that the figures are those of the product. */
export { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
export { sampleInput } from '@ligament/domain/assessment/testing/sample-input';
export { tableOf } from '@ligament/domain/assessment/fast-life/flaw-table';
export { AUDIT, STANDARD } from '@ligament/domain/assessment/fast-life/life-accuracy';
export { surfaceFlawLife } from '@ligament/domain/assessment/fast-life/surface-flaw-life';
export { surfaceFlawLives } from '@ligament/domain/assessment/fast-life/surface-flaw-lives';
export {
  randomFlaws,
  TWO_STAGES,
} from '@ligament/domain/assessment/fast-life/testing/random-flaws';
export { readableLife } from '@ligament/domain/assessment/fast-life/testing/readable-life';
export { stressMap } from '@ligament/domain/fracture/tip-field/stress-map';
