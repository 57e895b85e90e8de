import { assess } from './testing/assess';
import { given } from './testing/sample-input';

const value = (flaw: ReturnType<typeof assess>, symbol: string) =>
  flaw.sheet.find((step) => step.symbol === symbol)?.value;

describe('the calculation sheet', () => {
  const flaw = assess({
    insideDiameter: 1500,
    bending: 30,
    residual: { state: 'heat-treated', flawToWeld: 'transverse' },
    facePressure: 2,
  });

  it('shows the very figures of the outcome', () => {
    expect(value(flaw, 'KIp')).toBe(flaw.kPrimaryMPaSqrtM);
    expect(value(flaw, 'KIs')).toBe(flaw.kSecondaryMPaSqrtM);
    expect(value(flaw, 'Kr')).toBe(flaw.kr);
    expect(value(flaw, 'Lr')).toBe(flaw.lr);
    expect(value(flaw, 'Lr,max')).toBe(flaw.lrMax);
    expect(value(flaw, 'σref')).toBe(flaw.referenceStressMPa);
    expect(value(flaw, 'Qm')).toBe(flaw.residualMembraneMPa);
    expect(value(flaw, 'FL')).toBe(flaw.reserveOnLoad);
    expect(value(flaw, 'FK')).toBe(flaw.reserveOnToughness);
    expect(value(flaw, 'hlim')).toBe(flaw.limitingHeightMm);
    expect(value(flaw, 'T')).toBe(flaw.life.years);
  });

  it('closes: (KIp + KIs)/Kmat + ρ is Kr', () => {
    const [kp, ks, rho] = ['KIp', 'KIs', 'ρ'].map((symbol) => Number(value(flaw, symbol)));
    expect(((kp ?? 0) + (ks ?? 0)) / 80 + (rho ?? 0)).toBeCloseTo(flaw.kr, 10);
  });

  it('gives a formula and a source for every step, and inputs where something went in', () => {
    for (const step of flaw.sheet) {
      expect(step.formula.length).toBeGreaterThan(3);
      expect(step.source.length).toBeGreaterThan(3);
    }
  });

  it('stands under headings in the order of the computation', () => {
    expect([...new Set(flaw.sheet.map(({ group }) => group))]).toEqual([
      'Flaw size',
      'Reference stress',
      'Residual stress',
      'Stress intensity',
      'Failure assessment diagram',
      'Growth and remaining life',
    ]);
  });

  it('names the growth law, each block and the stress corrosion rate', () => {
    const both = assess({ stressCorrosion: 0.2 });
    expect(value(both, 'da/dN')).toBe('5.21e-13 ΔK^3');
    expect(value(both, 'da/dt')).toBe(0.2);
    const law = both.sheet.find(({ symbol }) => symbol === 'da/dN');
    expect(law?.inputs[0]).toMatch(/Δσm = 120 MPa.*per year/);
  });

  it('shows the ligament of an embedded flaw, and the rule when it counts as a surface flaw', () => {
    expect(value(assess({ kind: 'embedded', ligament: 10 }), 'p')).toBeCloseTo(9.5, 10);
    const near = assess({ kind: 'embedded', height: 6, ligament: 1.5 });
    const depth = near.sheet.find(({ name }) => name === 'Depth as a surface flaw');
    expect(depth?.value).toBeCloseTo(8, 10);
    expect(depth?.source).toMatch(/IWA-3300/);
  });

  it('says none where there is no figure', () => {
    const gone = assess({ membrane: 480 });
    expect(value(gone, 'FK')).toBe('collapse governs');
    expect(value(gone, 'T')).toBe('none');
  });

  it('shows residual bending only when there is some', () => {
    expect(value(flaw, 'Qb')).toBeUndefined();
    const residual = { state: 'entered', membraneMPa: given(50), bendingMPa: given(20) } as const;
    expect(value(assess({ residual }), 'Qb')).toBe(20);
  });

  it('says which line is drawn for a yield plateau', () => {
    const step = assess({ plateau: true }).sheet.find(({ symbol }) => symbol === 'f(Lr)');
    expect(step?.formula).toMatch(/yield plateau/);
  });
});
