import { assessFlaw, ENGINE_VERSION } from './assess-flaw';
import { assess, refuse } from './testing/assess';
import { sampleInput } from './testing/sample-input';

describe('assessFlaw', () => {
  it('gives a verdict with reserves, limiting size, life, checks, cautions and sheet', () => {
    const flaw = assess();
    expect(flaw).toMatchObject({
      status: 'assessed',
      engineVersion: ENGINE_VERSION,
      verdict: 'acceptable',
    });
    expect(flaw.reserveOnLoad).toBeGreaterThan(1.2);
    expect(flaw.reserveOnToughness).toBeGreaterThan(1);
    expect(flaw.limitingHeightMm).toBeGreaterThan(flaw.assessed.heightMm);
    expect(flaw.life.years).toBeGreaterThan(0);
    expect(flaw.checks.every((check) => check.met)).toBe(true);
    expect(flaw.cautions.length).toBeGreaterThan(0);
    expect(flaw.sheet.length).toBeGreaterThan(10);
  });

  it('adds the sizing allowance before anything is computed', () => {
    const flaw = assess({ height: 4, allowance: 1.5, length: 24, lengthAllowance: 3 });
    expect(flaw.assessed).toMatchObject({ heightMm: 5.5, aMm: 5.5, cMm: 13.5, ligamentMm: 19.5 });
  });

  it('answers the same input with the same bits', () => {
    expect(JSON.stringify(assessFlaw(sampleInput()))).toBe(
      JSON.stringify(assessFlaw(sampleInput())),
    );
  });

  it('leaves its input untouched', () => {
    const input = sampleInput({ bending: 30, residual: { state: 'as-welded' } });
    const before = JSON.stringify(input);
    assessFlaw(input);
    expect(JSON.stringify(input)).toBe(before);
  });

  it('survives a way through JSON without losing a figure', () => {
    const flaw = assess();
    expect(JSON.parse(JSON.stringify(flaw))).toEqual(flaw);
  });

  it('calls a flaw near the limit when the reserve on load is below 1.2', () => {
    const flaw = assess({ membrane: 300, height: 8 });
    expect(flaw.reserveOnLoad).toBeGreaterThan(1);
    expect(flaw.reserveOnLoad).toBeLessThan(1.2);
    expect(flaw.verdict).toBe('near the limit');
    expect(flaw.reasons[0]).toMatch(/below 1\.2 \(common practice\)/);
  });

  it('calls a flaw not acceptable outside the diagram and gives it no life', () => {
    const flaw = assess({ toughness: 12 });
    expect(flaw.verdict).toBe('not acceptable');
    expect(flaw.life).toMatchObject({ years: null, cycles: null, end: 'already at limit' });
    expect(flaw.path).toHaveLength(1);
    expect(flaw.reserveOnLoad).toBeLessThan(1);
    expect(flaw.reserveOnToughness).toBeLessThan(1);
  });

  it('says that collapse governs when no toughness would do', () => {
    const flaw = assess({ membrane: 480 });
    expect(flaw.verdict).toBe('not acceptable');
    expect(flaw.reserveOnToughness).toBeNull();
    expect(flaw.reasons[0]).toMatch(/cut-off/);
  });

  it('brings the point exactly to the line when the load is raised by the reserve factor', () => {
    const { reserveOnLoad } = assess({ membrane: 120 });
    expect(assess({ membrane: 120 * reserveOnLoad, range: 1 }).reserveOnLoad).toBeCloseTo(1, 7);
  });

  it('is at the line with the toughness divided by its reserve', () => {
    const residual = { state: 'heat-treated', flawToWeld: 'parallel' } as const;
    const { reserveOnToughness } = assess({ residual });
    const toughness = 80 / (reserveOnToughness ?? 1);
    expect(assess({ residual, toughness }).reserveOnToughness).toBeCloseTo(1, 7);
  });

  it('is at the line at the limiting height', () => {
    const { limitingHeightMm } = assess({ toughness: 25 });
    const there = assess({ toughness: 25, height: (limitingHeightMm ?? 0) - 1 });
    expect(there.reserveOnLoad).toBeCloseTo(1, 5);
  });

  it('names the end of the solution when the flaw stays inside until then', () => {
    const flaw = assess({ membrane: 40, toughness: 300 });
    expect(flaw.limitingHeightMm).toBeCloseTo(20, 5);
    expect(flaw.limitingBecause).toMatch(/a\/t ≤ 0\.8/);
  });

  it('lists the inputs that rest on an assumption', () => {
    const input = sampleInput();
    const assumed = { ...input.material.toughnessMPaSqrtM, provenance: 'assumed' } as const;
    const outcome = assessFlaw({
      ...input,
      material: { ...input.material, toughnessMPaSqrtM: assumed },
    });
    expect(outcome).toMatchObject({ assumed: ['material.toughnessMPaSqrtM'] });
  });

  it('gives no verdict outside a solution and says what to do instead', () => {
    const { refusals } = refuse({ height: 21 });
    expect(refusals).toEqual([
      expect.objectContaining({ input: 'flaw.heightMm', limit: 'a/t ≤ 0.8', value: 0.88 }),
    ]);
    expect(refusals[0]?.instead).toMatch(/through-wall/);
  });

  it('refuses a very long deep flaw rather than stretch the plate equation', () => {
    const { refusals } = refuse({ height: 18.5, length: 2000 });
    expect(refusals[0]?.limit).toMatch(/a\/t ≤ 1\.25 \(a\/c \+ 0\.6\)/);
  });

  it('names the solutions it chose', () => {
    expect(assess({ insideDiameter: 1200 }).solution.stressIntensity).toMatch(
      /Axial.*inside a cylinder/,
    );
    expect(assess({ insideDiameter: 1200, face: 'outside' }).solution.stressIntensity).toMatch(
      /outside/,
    );
    expect(
      assess({ insideDiameter: 1200, orientation: 'circumferential' }).solution.referenceStress,
    ).toMatch(/Circumferential/);
    expect(assess({ kind: 'embedded', ligament: 10 }).solution.stressIntensity).toMatch(/Embedded/);
  });

  it('counts pressure on the crack faces', () => {
    const [without, withPressure] = [assess(), assess({ facePressure: 5 })];
    expect(withPressure.kPrimaryMPaSqrtM / without.kPrimaryMPaSqrtM).toBeCloseTo(125 / 120, 10);
    expect(withPressure.lr).toBeGreaterThan(without.lr);
    expect(withPressure.cautions.join(' ')).toMatch(/crack faces/);
  });

  it('draws the line to the cut-off and ends it there', () => {
    const { line, lrMax } = assess();
    expect(line[0]).toEqual({ lr: 0, kr: 1 });
    expect(line[line.length - 1]).toEqual({ lr: lrMax, kr: 0 });
  });

  it('ends the diagram at Lr = 1 for a material with a yield plateau', () => {
    expect(assess({ plateau: true }).lrMax).toBe(1);
    expect(assess({ plateau: true, membrane: 345 }).verdict).toBe('not acceptable');
  });

  it('says that the plastic zone is too large for K alone when it is', () => {
    expect(assess({ membrane: 200 }).cautions.some((text) => text.includes('2.5 (K/σY)²'))).toBe(
      true,
    );
    const large = assess({ membrane: 20, height: 8, thickness: 60, length: 40 });
    expect(large.cautions.some((text) => text.includes('2.5 (K/σY)²'))).toBe(false);
  });

  it('warns that stress corrosion may be faster', () => {
    expect(assess({ stressCorrosion: 0.1 }).cautions.join(' ')).toMatch(
      /Stress corrosion can be far faster/,
    );
  });
});
