import { evaluateChecks } from '@ligament/domain/verification/checks';
import type { CheckResult } from '@ligament/domain/verification/check-row';

const figure = (value: number) => (value === 0 ? '0' : Number(value.toPrecision(7)).toString());
const share = (value: number) => `${(100 * value).toPrecision(2)} %`;

const line = ({
  quantity,
  unit,
  published,
  computed,
  deviation,
  tolerance,
  met,
  kind,
  source,
}: CheckResult) =>
  [
    met ? 'ok ' : 'OUT',
    quantity.padEnd(88).slice(0, 88),
    figure(published).padStart(13),
    figure(computed).padStart(13),
    unit.padEnd(16),
    share(deviation).padStart(12),
    share(tolerance).padStart(10),
    `${kind}: ${source}`,
  ].join('  ');

const results = evaluateChecks();
let group = '';
for (const result of results) {
  if (result.group !== group) {
    group = result.group;
    console.log(
      `\n${group}\n     ${'quantity'.padEnd(88)}  ${'published'.padStart(13)}  ${'computed'.padStart(13)}  ${'unit'.padEnd(16)}  ${'deviation'.padStart(12)}  ${'tolerance'.padStart(10)}  source`,
    );
  }
  console.log(line(result));
}
const out = results.filter(({ met }) => !met);
console.log(
  `\n${results.length} values, ${results.length - out.length} within tolerance, ${out.length} outside.`,
);
process.exitCode = out.length > 0 ? 1 : 0;
