/** Round values from 0 (or a first value) up to an end, about so many of them. */
export function axisTicks(end: number, about = 5, from = 0): readonly number[] {
  const span = end - from;
  if (!(span > 0)) return [from];
  const step = roundStep(span / about);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(end / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, i) => clean((first + i) * step));
}

/** The step of 1, 2, 5, 10 … nearest above a rough one. */
export function roundStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  const share = rough / power;
  return power * (share <= 1 ? 1 : share <= 2 ? 2 : share <= 5 ? 5 : 10);
}

const clean = (value: number) => Number(value.toPrecision(12));
