/** Red, green and blue of one place of a scale, 0 to 255. */
type Colour = readonly [red: number, green: number, blue: number];

/** Sequential scale from calm to severe; even in lightness, so that it reads without colour too. */
const STOPS: readonly Colour[] = [
  [247, 249, 250],
  [200, 216, 224],
  [128, 168, 188],
  [66, 112, 140],
  [36, 64, 92],
  [20, 30, 48],
];

/** The colour of a share between 0 and 1 of the scale. */
export function colourOf(share: number): Colour {
  const at = Math.min(Math.max(share, 0), 1) * (STOPS.length - 1);
  const low = Math.min(Math.floor(at), STOPS.length - 2);
  const [from, to] = [STOPS[low] as Colour, STOPS[low + 1] as Colour];
  const mix = (i: 0 | 1 | 2) => Math.round(from[i] + (to[i] - from[i]) * (at - low));
  return [mix(0), mix(1), mix(2)];
}

/** One row of pixels from one end of the scale to the other. */
export function scalePixels(steps: number): Uint8ClampedArray<ArrayBuffer> {
  const pixels = new Uint8ClampedArray(4 * steps);
  for (let i = 0; i < steps; i++) {
    pixels.set([...colourOf(i / (steps - 1)), 255], 4 * i);
  }
  return pixels;
}
