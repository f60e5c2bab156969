import type { SAFETY_SOURCES, Status } from '../model';
import { IEC_61936_1, RD_337_2014_RAT_15, type SourceDocument } from '../sources';
import type { StandardTable } from './table';

/** What people stand, walk or drive behind or beneath. */
export const SAFETY_KINDS = [
  'solid-wall',
  'mesh-or-screen',
  'indoor-obstacle',
  'outdoor-obstacle',
  'boundary-wall',
  'boundary-mesh',
  'height-over-access',
  'vehicle',
  'insulator-base-height',
  'height-outside-boundary',
] as const;

/** A safety distance of a station, from the least electrical distance N (IEC) or d (RD 337/2014). */
export interface SafetyDistanceRow {
  source: (typeof SAFETY_SOURCES)[number];
  kind: (typeof SAFETY_KINDS)[number];
  /** As the document names it; null where it has no letter. */
  symbol: string | null;
  /** Added to the electrical distance; null where the least figure stands alone. */
  additionMm: number | null;
  /** Not below this; null where there is no floor. */
  leastMm: number | null;
  /** Um above this, kV r.m.s.; null from the lowest. */
  overVoltageKv: number | null;
  /** Um up to this, boundary included, kV r.m.s.; null to the highest. */
  upToVoltageKv: number | null;
}

const safety = (
  source: SafetyDistanceRow['source'],
  kind: SafetyDistanceRow['kind'],
  symbol: string | null,
  additionMm: number | null,
  leastMm: number | null,
  overVoltageKv: number | null,
  upToVoltageKv: number | null,
): SafetyDistanceRow & { status: Status } => ({
  source,
  kind,
  symbol,
  additionMm,
  leastMm,
  overVoltageKv,
  upToVoltageKv,
  status: source === 'rd-337' ? 'seen' : 'memory',
});

/** Documents of the two sources, as a row is cited. */
export const SAFETY_DOCUMENTS: Record<SafetyDistanceRow['source'], SourceDocument & { clause: string }> = {
  'rd-337': { ...RD_337_2014_RAT_15, clause: '4.1 to 4.3' },
  'iec-61936-1': { ...IEC_61936_1, clause: 'safety distances' },
};

// Source, kind, symbol; addition, least; Um over, Um up to.
/** Additions to the electrical distance by source. */
export const SAFETY_DISTANCES: StandardTable<SafetyDistanceRow> = {
  key: 'stations:safety-distances',
  title: 'Safety distances of stations',
  document: 'RD 337/2014, ITC-RAT 15; IEC 61936-1',
  edition: '2014; 2010',
  clause: '4.1 to 4.3; safety distances',
  rule: 'rows-as-printed',
  identifiedBy: ['source', 'kind', 'symbol', 'upToVoltageKv'],
  remarks: [
    'The rows of RD 337/2014 were read; those of IEC 61936-1 were not.',
    'Solid walls, meshes and screens at least 1800 mm high. They are no distances for live work.',
  ],
  rows: [
    safety('rd-337', 'solid-wall', null, 30, null, null, null),
    safety('rd-337', 'mesh-or-screen', null, 100, null, null, null),
    safety('rd-337', 'indoor-obstacle', null, 200, 1250, null, null),
    safety('rd-337', 'outdoor-obstacle', null, 300, 1250, null, null),
    safety('rd-337', 'boundary-wall', null, 1000, null, null, null),
    safety('rd-337', 'boundary-mesh', null, 1500, null, null, null),
    safety('rd-337', 'height-over-access', 'H', 2500, null, null, null),
    safety('rd-337', 'vehicle', 'T', 100, 500, null, null),
    safety('rd-337', 'insulator-base-height', null, null, 2300, null, null),
    safety('iec-61936-1', 'solid-wall', 'B1', 0, null, null, null),
    safety('iec-61936-1', 'mesh-or-screen', 'B2', 100, null, 52, null),
    safety('iec-61936-1', 'mesh-or-screen', 'B3', 80, null, null, 52),
    safety('iec-61936-1', 'indoor-obstacle', 'O1', 200, 500, null, null),
    safety('iec-61936-1', 'outdoor-obstacle', 'O2', 300, 600, null, null),
    safety('iec-61936-1', 'boundary-wall', 'C', 1000, null, null, null),
    safety('iec-61936-1', 'boundary-mesh', 'E', 1500, null, null, null),
    safety('iec-61936-1', 'height-over-access', 'H', 2250, 2500, null, null),
    safety('iec-61936-1', 'vehicle', 'T', 100, 500, null, null),
    safety('iec-61936-1', 'insulator-base-height', null, null, 2250, null, null),
    safety('iec-61936-1', 'height-outside-boundary', "H'", null, 4300, null, 52),
    safety('iec-61936-1', 'height-outside-boundary', "H'", 4500, 6000, 52, null),
  ],
};
