import { engineBundle } from '../bench/bundle-engine';

const MOST_GZIPPED = 60_000;

describe('the engine as a browser loads it', () => {
  const bundle = engineBundle();

  it('is under 60 kB, gzipped', async () => {
    const { gzipped, bytes } = await bundle;
    expect(bytes).toBeGreaterThan(10_000);
    expect(gzipped).toBeLessThan(MOST_GZIPPED);
  });

  it('holds no schema, no checks of input from the wire and nothing of the server', async () => {
    const { text, inputs } = await bundle;
    expect(inputs.filter((path) => /node_modules/.test(path))).toEqual([]);
    expect(inputs.filter((path) => /domain\/src\/(schema|contract)\//.test(path))).toEqual([]);
    expect(text).not.toMatch(/drizzle|\bzod\b|["']node:/i);
  });

  it('asks for no other file', async () => {
    const { text } = await bundle;
    expect(text).not.toMatch(/\bimport\s*[({"']|\brequire\(/);
  });
});
