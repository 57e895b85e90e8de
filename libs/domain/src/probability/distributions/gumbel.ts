import type { Distribution } from './distribution';
import { fromTails } from './from-tails';

const EULER = 0.5772156649015329;

/** Gumbel distribution of largest values by mean and standard deviation, as for a yearly largest load. */
export function gumbel(mean: number, sd: number): Distribution {
  const scale = (sd * Math.sqrt(6)) / Math.PI;
  const mode = mean - EULER * scale;
  const reduced = (x: number) => Math.exp(-(x - mode) / scale);
  return fromTails({
    mean,
    sd,
    density: (x) => {
      const r = reduced(x);
      return Number.isFinite(r) ? (r * Math.exp(-r)) / scale : 0;
    },
    below: (x) => Math.exp(-reduced(x)),
    above: (x) => -Math.expm1(-reduced(x)),
    atLower: (p) => mode - scale * Math.log(-Math.log(p)),
    atUpper: (q) => mode - scale * Math.log(-Math.log1p(-q)),
  });
}
