/**
 * Idealised shapes of a flaw: semi-ellipse at a face, the same without end along that face, ellipse inside the
 * wall, crack through the whole wall, quarter ellipse at a corner, crack through a free edge of a plate.
 */
export const FLAW_KINDS = [
  'surface',
  'extended surface',
  'embedded',
  'through-wall',
  'corner',
  'edge',
] as const;
export type FlawKind = (typeof FLAW_KINDS)[number];

/** Bodies that hold a flaw. */
export const WALL_SHAPES = [
  'plate',
  'cylinder',
  'sphere',
  'hole edge',
  'nozzle corner',
  'round bar',
] as const;
export type WallShape = (typeof WALL_SHAPES)[number];

/** Which flaws a body can hold and be assessed for. */
export const KINDS_OF_WALL: Readonly<Record<WallShape, readonly FlawKind[]>> = {
  plate: FLAW_KINDS,
  cylinder: ['surface', 'extended surface', 'embedded', 'through-wall'],
  sphere: ['surface', 'embedded', 'through-wall'],
  'hole edge': ['through-wall', 'corner'],
  'nozzle corner': ['corner'],
  'round bar': ['extended surface', 'embedded'],
};

/** Whether the length of the flaw is measured from an edge, so that it is c and not 2c. */
export const lengthIsOneSided = (kind: FlawKind, shape: WallShape): boolean =>
  kind === 'corner' || kind === 'edge' || (kind === 'through-wall' && shape === 'hole edge');

/** Whether the flaw has a length of its own that can grow. */
export const hasLength = (kind: FlawKind): boolean => kind !== 'extended surface';

/** Whether the flaw has a height of its own: it does not when it goes through the whole wall. */
export const hasHeight = (kind: FlawKind): boolean => kind !== 'through-wall' && kind !== 'edge';
