import type { WorksheetInput } from '@bellgap/common/api';
import { WORKSHEET_CHOICES } from '@bellgap/common/schemas';

/** A figure as the form holds it: read, empty, or text that could not be read. */
type Typed = number | string | null;

/** The one that has to be known stands first: the other may be left out without moving its row. */
export const PLACES = ['other-equipment', 'line-entrance'] as const satisfies (keyof typeof WORKSHEET_CHOICES.place)[];

const BLANK_PLACE = {
  slowFrontPhaseToEarthPu: null as Typed,
  slowFrontPhaseToPhasePu: null as Typed,
  phaseToEarthCoordinationFactor: null as Typed,
  phaseToPhaseCoordinationFactor: null as Typed,
};

const BLANK = {
  altitudeM: null as Typed,
  earthFaultFactor: null as Typed,
  loadRejectionFactor: null as Typed,
  powerFrequencySurface: null as string | null,
  externalInsulation: null as string | null,
  switchingPhaseToEarthExponent: null as Typed,
  arrester: { switchingProtectionKvPeak: null as Typed, lightningProtectionKvPeak: null as Typed },
  places: PLACES.map(() => BLANK_PLACE),
  fastFront: {
    subconductorsCount: null as Typed,
    linesConnectedCount: null as Typed,
    spanM: null as Typed,
    lineOutageRatePerKmYear: null as Typed,
    acceptedFailureRatePerYear: null as Typed,
    arresterToInternalM: null as Typed,
    arresterToExternalM: null as Typed,
  },
};

/** What the form of a worksheet holds; the highest voltage is the one of the basis. */
export type WorksheetValues = typeof BLANK;

function filled<Part extends object>(blank: Part, given: object | null | undefined): Part {
  const entries = Object.keys(blank).map((name) => [name, (given as Record<string, unknown> | null)?.[name] ?? null]);
  return Object.fromEntries(entries) as Part;
}

export function worksheetValues(stored: WorksheetInput | null | undefined): WorksheetValues {
  return {
    ...filled(BLANK, stored),
    arrester: filled(BLANK.arrester, stored?.arrester),
    places: PLACES.map((name) =>
      filled(
        BLANK_PLACE,
        stored?.places?.find(({ place }) => place === name),
      ),
    ),
    fastFront: filled(BLANK.fastFront, stored?.fastFront),
  };
}

const isBlank = (value: unknown): boolean =>
  value === null || (typeof value === 'object' && Object.values(value as object).every(isBlank));

export const isBlankWorksheet = (values: WorksheetValues): boolean => isBlank(values);

/** The worksheet as the API has it; null where nothing is filled in, parts that hold nothing are left out. */
export function worksheetBody(values: WorksheetValues, highestVoltageKv: Typed): WorksheetInput | null {
  if (isBlank(values)) return null;
  const { arrester, places, fastFront, ...rest } = values;
  const described = places.map((figures, index) => ({ place: PLACES[index], ...figures }));
  const last = places.findLastIndex((figures) => !isBlank(figures));
  return {
    highestVoltageKv,
    ...rest,
    arrester: isBlank(arrester) ? null : arrester,
    places: last < 0 ? null : described.slice(0, last + 1),
    fastFront: isBlank(fastFront) ? null : fastFront,
  } as WorksheetInput;
}
