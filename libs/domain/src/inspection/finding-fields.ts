import type { FindingFieldName } from '../contract/finding-field-names';

/** What a column of an inspector's file can mean. */
export interface FindingField {
  readonly field: FindingFieldName;
  readonly label: string;
  readonly kind: 'text' | 'length' | 'position around' | 'number' | 'date' | 'word';
  /** Header words that mean it, without units, in lower case; English first, then words common in files from elsewhere. */
  readonly synonyms: readonly string[];
}

const text = (field: FindingFieldName, label: string, ...synonyms: string[]): FindingField => ({
  field,
  label,
  kind: 'text',
  synonyms,
});
const length = (field: FindingFieldName, label: string, ...synonyms: string[]): FindingField => ({
  field,
  label,
  kind: 'length',
  synonyms,
});
const word = (field: FindingFieldName, label: string, ...synonyms: string[]): FindingField => ({
  field,
  label,
  kind: 'word',
  synonyms,
});

export const FINDING_FIELDS = [
  text(
    'reportNo',
    'Report number',
    'report no',
    'report number',
    'report',
    'bericht report',
    'bericht',
    'rapport',
  ),
  {
    field: 'inspectionDate',
    label: 'Inspection date',
    kind: 'date',
    synonyms: ['inspection date', 'date', 'datum', 'examined on', 'scan date'],
  },
  text(
    'componentTag',
    'Component tag',
    'component tag',
    'component',
    'tag',
    'equipment',
    'vessel',
    'kessel',
    'item',
    'line',
  ),
  text(
    'weld',
    'Weld or place',
    'weld id',
    'weld',
    'weld no',
    'seam',
    'naht',
    'soudure',
    'location',
    'joint',
  ),
  text(
    'indicationNo',
    'Indication number',
    'indication no',
    'indication',
    'ind',
    'ind no',
    'no',
    'nr',
    'flaw no',
    'item no',
  ),
  text('technique', 'Technique', 'technique', 'method', 'verfahren'),
  text('procedure', 'Procedure', 'procedure no', 'procedure'),
  text('operator', 'Operator', 'operator', 'inspector', 'examiner', 'prufer'),
  text('certificate', 'Certificate', 'operator cert', 'certificate', 'cert no'),
  text('datum', 'Datum mark', 'datum id', 'datum mark', 'datum point'),
  length(
    'axial',
    'Position along the weld or axis',
    'axial from datum',
    'axial',
    'axial position',
    'position',
    'x',
    'start pos',
    'distance',
    'pos',
  ),
  {
    field: 'circumferential',
    label: 'Position around',
    kind: 'position around',
    synonyms: [
      'circ position',
      'circumferential',
      'circ',
      'clock',
      'uhr',
      'angle',
      'o clock',
      'around',
    ],
  },
  length('crossWeld', 'Offset across the weld', 'cross weld offset', 'offset', 'y'),
  word('scanSurface', 'Scan surface', 'scan surface', 'scanned from', 'scan side'),
  length(
    'depthToTop',
    'Depth to the upper tip, from the scan surface',
    'depth to top',
    'depth',
    'd top',
    'd',
    'tiefe',
    'upper tip',
    'profondeur',
    'top',
  ),
  length(
    'depthToBottom',
    'Depth to the lower tip, from the scan surface',
    'depth to bottom',
    'lower tip',
    'bottom',
    'd bottom',
  ),
  length(
    'height',
    'Height through the wall',
    'height',
    'h',
    'hohe',
    'through wall',
    'through wall size',
    'hauteur',
    'th',
  ),
  length('length', 'Length', 'length', 'l', 'lange', 'longueur'),
  length('ligament', 'Ligament to the nearer surface', 'ligament', 'lig', 'remaining ligament'),
  word(
    'positionType',
    'Surface or embedded',
    'position type',
    'surface embedded',
    'type of position',
  ),
  word('opensTo', 'Opens to', 'opens to', 'surface', 'side', 'connected to', 'seite'),
  word('orientation', 'Orientation', 'orientation', 'direction', 'richtung'),
  length('skew', 'Skew', 'skew', 'skew deg'),
  word(
    'indicationType',
    'Type of indication',
    'indication type',
    'type',
    'art',
    'characterisation',
    'classification',
  ),
  {
    field: 'amplitude',
    label: 'Amplitude against reference',
    kind: 'number',
    synonyms: ['amplitude db rel ref', 'amplitude', 'db', 'amp', 'echo height'],
  },
  text('probe', 'Probe', 'probe', 'transducer'),
  length('heightError', 'Sizing error of the height, 1 SD', 'height error', 'height error 1 sd'),
  length('lengthError', 'Sizing error of the length, 1 SD', 'length error', 'length error 1 sd'),
  length(
    'wall',
    'Wall at the indication',
    'wall at indication',
    'wall',
    'wt',
    'local wall',
    'wanddicke',
  ),
  text(
    'remarks',
    'Remarks',
    'remarks',
    'remark',
    'rem',
    'comment',
    'note',
    'bemerkung',
    'remarque',
  ),
] as const satisfies readonly FindingField[];

export type FieldName = FindingFieldName;

export const fieldNamed = (name: string): FindingField | undefined =>
  FINDING_FIELDS.find(({ field }) => field === name);
