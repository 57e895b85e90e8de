import type { Face, FlawKind, IndicationType, Orientation } from '../contract/vocabulary';

/** Reads one of a few words from a cell; undefined when it says none of them. */
type WordReader<T> = (cell: string) => T | undefined;

const reader =
  <T>(words: readonly (readonly [RegExp, T])[]): WordReader<T> =>
  (cell) =>
    words.find(([pattern]) => pattern.test(cell.trim()))?.[1];

export const readFace = reader<Face>([
  [/^(id|inside|inner|internal|innen|bore)$/i, 'inside'],
  [/^(od|outside|outer|external|aussen|außen)$/i, 'outside'],
]);

export const readKind = reader<FlawKind>([
  [/corner|\becke/i, 'corner'],
  [/embedded|internal|buried|subsurface|innenliegend/i, 'embedded'],
  [/surface|breaking|toe|root|oberfl/i, 'surface'],
]);

export const readOrientation = reader<Orientation>([
  [/^(axial|a|longitudinal|long|längs|laengs)$/i, 'axial'],
  [/^(circ|circumferential|c|transverse|umfang)$/i, 'circumferential'],
]);

/** Words said of the weld as well as of the vessel. */
export const isWeldRelative = (cell: string): boolean =>
  /^(longitudinal|long|längs|laengs|transverse)$/i.test(cell.trim());

export const readIndicationType = reader<IndicationType>([
  [/crack|riss|fissure/i, 'crack'],
  [/lack of fusion|\blof\b|bindefehler/i, 'lack of fusion'],
  [/penetration|\blop\b/i, 'lack of penetration'],
  [/slag|schlacke/i, 'slag'],
  [/poros|pore/i, 'porosity'],
  [/lamina/i, 'lamination'],
  [/point|punkt/i, 'point'],
  [/geometr/i, 'geometry'],
  [/^(unknown|\?+|unklar)$/i, 'unknown'],
]);

/** A cell that is empty or says that nothing is given. */
export const saysNothing = (cell: string): boolean => /^(|-+|n\/?a|none|no)$/i.test(cell.trim());
