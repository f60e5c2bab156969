import type { BodyOf, InsulatorUnit, Revision, SpecificationInput, contract } from '@bellgap/common/api';
import { INHERITED_PATHS } from '@bellgap/common/schemas';
import { getIn, setIn } from 'formik';
import { CONDITIONAL_PATHS, applies } from './applies';
import { differsFromBasis, type PinnedBasis } from './inheritance';

export type SaveBody = BodyOf<typeof contract.saveRevision>;

/** Every field that the page can show, filled with null where nothing is known. */
const BLANK = {
  kind: null,
  basis: null,
  system: {
    nominalVoltageKv: null,
    highestVoltageKv: null,
    frequencyHz: null,
    neutralEarthing: null,
    earthFault: null,
    insulationLevel: null,
    overvoltages: { slowFrontPhaseToEarthKvPeak: null, slowFrontPhaseToPhaseKvPeak: null, earthFaultFactor: null },
    faultCurrentKa: null,
    faultDurationS: null,
  },
  site: {
    altitudeM: null,
    pollution: { class: null, type: null, contamination: null, basis: null, recheckBy: null },
  },
  string: {
    insulatorCode: null,
    arrangement: null,
    parallelStrings: null,
    rodsInSeries: null,
    surroundings: null,
    spareUnits: null,
    arcingDevices: null,
    arcGapMm: null,
    hardwareLengthMm: null,
    vAngleWindwardDeg: null,
    vAngleLeewardDeg: null,
    sharing: { pinToEarthRatio: null, pinToLineRatio: null },
  },
  clearance: {
    method: null,
    shapePhaseToEarth: null,
    shapePhaseToPhase: null,
    fastFrontFrom: null,
    enGap: null,
    externalClearanceMm: null,
    safetySource: null,
  },
} as const;

export type FormInput = Record<string, unknown>;

/** What the form holds. Paths in `reasons` and `unread` are those of the input, without a prefix. */
export interface FormValues {
  title: string;
  input: FormInput;
  /** Reason of each figure that differs from the design basis. */
  reasons: Record<string, string>;
  /** Texts that could not be read, exactly as typed. */
  unread: Record<string, string>;
}

type Tree = Record<string, unknown>;
const isTree = (value: unknown): value is Tree => typeof value === 'object' && value !== null && !Array.isArray(value);

function fill(blank: Tree, given: unknown): Tree {
  const source = isTree(given) ? given : {};
  const filled: Tree = { ...source };
  for (const [name, empty] of Object.entries(blank)) {
    filled[name] = isTree(empty) ? fill(empty, source[name]) : (source[name] ?? empty);
  }
  return filled;
}

export function formOf(revision: Pick<Revision, 'title' | 'input' | 'overrides'>): FormValues {
  return {
    title: revision.title,
    input: fill(BLANK, revision.input),
    reasons: Object.fromEntries(revision.overrides.map(({ path, reason }) => [path, reason])),
    unread: {},
  };
}

export function valueAt<T = unknown>(values: FormValues, path: string): T | null {
  return (getIn(values.input, path) as T | null | undefined) ?? null;
}

export function withValue(values: FormValues, path: string, value: unknown, unread?: string): FormValues {
  const { [path]: _dropped, ...unreadOthers } = values.unread;
  return {
    ...values,
    input: setIn(values.input, path, value) as FormInput,
    unread: unread === undefined ? unreadOthers : { ...unreadOthers, [path]: unread },
  };
}

const allNull = (tree: unknown): boolean =>
  isTree(tree) ? Object.values(tree).every(allNull) : tree === null || tree === undefined;

/** The pollution of the scale that the basis uses; class letters and contamination levels are never converted. */
function pollutionOf(input: Tree, given: Tree): Tree {
  const { class: letter, type, contamination, basis, recheckBy } = given;
  return input.basis === 'north-american'
    ? { contamination, basis, recheckBy }
    : { class: letter, type, basis, recheckBy };
}

/** The input as it is asked and stored: what does not apply is unknown, parts that hold nothing are left out. */
export function inputOf(values: FormValues, unit: InsulatorUnit | null): SpecificationInput {
  let input = values.input as Tree;
  for (const path of CONDITIONAL_PATHS) {
    if (((getIn(input, path) as unknown) ?? null) !== null && !applies(path, values, unit))
      input = setIn(input, path, null) as Tree;
  }
  const system = { ...(input.system as Tree) };
  if (allNull(system.overvoltages)) delete system.overvoltages;
  const site = input.site as Tree;
  const string = { ...(input.string as Tree) };
  if (allNull(string.sharing)) delete string.sharing;
  const next: Tree = {
    ...input,
    system,
    string,
    site: { ...site, pollution: pollutionOf(input, site.pollution as Tree) },
  };
  if (input.kind === 'bay' && allNull(input.string)) delete next.string;
  if (allNull(input.clearance)) delete next.clearance;
  if (input.kind === 'bay' || (input.mechanical ?? null) === null) delete next.mechanical;
  return next as unknown as SpecificationInput;
}

/** The form as the server would have it: what does not apply is unknown. For setting two versions side by side. */
export function asStored(values: FormValues, unit: InsulatorUnit | null): FormValues {
  return { ...values, input: fill(BLANK, inputOf(values, unit)) };
}

export function bodyOf(values: FormValues, unit: InsulatorUnit | null, basis: PinnedBasis | null): SaveBody {
  const input = inputOf(values, unit);
  return {
    title: values.title,
    input: input as SaveBody['input'],
    overrides: basis
      ? INHERITED_PATHS.filter((path) => differsFromBasis(path, input, basis)).map((path) => ({
          path,
          reason: values.reasons[path] ?? '',
        }))
      : [],
  };
}
