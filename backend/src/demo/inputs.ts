import type { SpecificationInput } from '@bellgap/common/api';

type Site = NonNullable<SpecificationInput['site']>;
type StringPart = NonNullable<SpecificationInput['string']>;
type Clearance = NonNullable<SpecificationInput['clearance']>;

/** Parts of demo inputs. Each zone takes the altitude of its highest structure, rounded up to the next 100 m. */

export function site(
  altitudeM: number,
  pollutionClass: 'a' | 'b' | 'c' | 'd' | 'e',
  basis: 'measured' | 'estimated' | 'assumed',
  { type = 'A', recheckBy = null }: { type?: 'A' | 'B' | 'AB'; recheckBy?: string | null } = {},
): Site {
  return { altitudeM, pollution: { class: pollutionClass, type, basis, recheckBy } };
}

export function string(
  insulatorCode: string,
  arrangement: StringPart['arrangement'],
  others: Partial<StringPart> = {},
): StringPart {
  return {
    insulatorCode,
    arrangement,
    parallelStrings: 1,
    surroundings: 'cross-arm',
    spareUnits: 0,
    arcingDevices: 'none',
    arcGapMm: null,
    hardwareLengthMm: 420,
    ...others,
  };
}

export const LINE_CLEARANCE: Clearance = {
  method: 'iec-table',
  shapePhaseToEarth: 'conductor-structure',
  shapePhaseToPhase: 'conductor-conductor',
  fastFrontFrom: 'level',
  enGap: 'structure',
  externalClearanceMm: null,
  safetySource: null,
};

export const EN_CLEARANCE: Clearance = { ...LINE_CLEARANCE, method: 'en-empirical' };
