import type {
  Face,
  FlawKind,
  HeatTreatment,
  IndicationType,
  LocationKind,
  Orientation,
  SizeQualifier,
} from '../contract/vocabulary';
import type { LengthUnit } from './recognise-columns';

/** The component and inspection that a file is checked against. */
export interface ImportContext {
  readonly tag: string;
  /** Number of the report that the findings belong to. */
  readonly reportNo: string;
  readonly wallMm: number;
  readonly insideDiameterMm: number;
  readonly locations: readonly {
    readonly id: string;
    readonly name: string;
    readonly kind: LocationKind;
    readonly lengthMm: number | null;
    readonly circumferenceOn: Face;
    readonly heatTreatment?: HeatTreatment | null;
  }[];
  readonly inspectedOn: string | null;
  readonly today: string;
  readonly scanSurface: Face;
  /** Sizing error of the technique, 1 SD; null when the inspection does not state it. */
  readonly heightErrorMm: number | null;
  readonly lengthErrorMm: number | null;
}

/** What the inspector answers once for a file; null is "not answered yet". */
export interface ImportAnswers {
  /** Unit of every length whose column and cell name none. */
  readonly lengthUnit: LengthUnit | null;
  readonly decimalMark: '.' | ',';
  /** Whether the position along the weld is the flaw's centre or its start. */
  readonly positionIs: 'centre' | 'start';
  /** Used where a column for it is missing or a cell empty. */
  readonly kind: FlawKind | null;
  readonly face: Face | null;
  readonly orientation: Orientation | null;
  readonly indicationType: IndicationType | null;
}

/** A finding as a row of the file gives it, in millimetres. */
export interface CandidateFinding {
  readonly indicationNo: string;
  readonly locationId: string;
  readonly locationName: string;
  readonly indicationType: IndicationType;
  readonly kind: FlawKind;
  readonly face: Face;
  readonly orientation: Orientation;
  readonly heightMm: number;
  readonly heightQualifier: SizeQualifier;
  readonly lengthMm: number;
  readonly lengthQualifier: SizeQualifier;
  readonly ligamentMm: number | null;
  readonly depthToTopMm: number | null;
  readonly axialMm: number | null;
  readonly circumferentialMm: number | null;
  readonly wallMm: number | null;
  readonly amplitudeDb: number | null;
  readonly heightErrorMm: number;
  readonly lengthErrorMm: number;
  readonly remarks: string;
}
