/** A rule by which an embedded flaw counts as one that breaks the surface. */
export interface SurfaceRule {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** Room of the ligament above what the rule demands [mm]; the flaw stays embedded while it is above 0. */
  readonly margin: (a: number, ligament: number, thickness: number) => number;
  /** The surface flaw it then is [mm]. */
  readonly surfaceFlaw: (
    a: number,
    c: number,
    ligament: number,
  ) => { readonly a: number; readonly c: number };
}

const NEAR_SHARE = 0.4;
const WALL_SHARE = 0.2;

/** The rules, the one that is taken by default first. */
export const SURFACE_RULES: readonly [SurfaceRule, ...SurfaceRule[]] = [
  {
    key: 'asme-proximity',
    title: 'Ligament below 0.4 of the half height',
    source: 'ASME XI IWA-3300 form (from memory)',
    margin: (a, ligament) => ligament - NEAR_SHARE * a,
    surfaceFlaw: (a, c, ligament) => ({ a: 2 * a + ligament, c }),
  },
  {
    key: 'api-wall-share',
    title: 'Ligament below 0.2 of the wall',
    source: 'API 579-1 Part 9 (from memory; the length added differs between codes)',
    margin: (_a, ligament, thickness) => ligament - WALL_SHARE * thickness,
    surfaceFlaw: (a, c, ligament) => ({ a: 2 * a + ligament, c: c + ligament }),
  },
  {
    key: 'ligament-gone',
    title: 'Only once nothing of the ligament is left',
    source:
      'BS 7910 Annex E recategorises on failure of the ligament (from memory); here the ligament itself is the limit, its failure is judged by the reference stress',
    margin: (_a, ligament) => ligament,
    surfaceFlaw: (a, c, ligament) => ({ a: 2 * a + ligament, c: c + ligament }),
  },
];

/** A rule by which a surface flaw counts as through the wall. */
export interface ThroughRule {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** Room of the depth below what the rule allows, as a share of the wall [-]. */
  readonly margin: (a: number, thickness: number) => number;
  /** Half length of the flaw through the wall [mm]. */
  readonly halfLength: (a: number, c: number, thickness: number) => number;
}

const DEEPEST_SHARE = 0.8;

export const THROUGH_RULES: readonly [ThroughRule, ...ThroughRule[]] = [
  {
    key: 'api-depth-share',
    title: 'Depth above 0.8 of the wall',
    source: 'API 579-1 Part 9 (from memory)',
    margin: (a, thickness) => DEEPEST_SHARE - a / thickness,
    halfLength: (a, c, thickness) => c + Math.max(thickness - a, 0),
  },
  {
    key: 'ligament-failed',
    title: 'Ligament failed',
    source: 'BS 7910 Annex E: on ligament failure, 2c + 2(B − a) (from memory)',
    margin: (a, thickness) => 1 - a / thickness,
    halfLength: (a, c, thickness) => c + Math.max(thickness - a, 0),
  },
];

/** The rule of a key; the default where the key is not known. */
export const surfaceRule = (key: string | null): SurfaceRule =>
  SURFACE_RULES.find((rule) => rule.key === key) ?? SURFACE_RULES[0];
