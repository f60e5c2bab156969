import type { ClearanceRow, TraceLine } from '@bellgap/common/api';

/** Lines of the working that lead to a figure; a line's id is "topic.name" or "topic.name:use". */
const LINES: readonly (readonly [figure: RegExp, line: RegExp])[] = [
  [
    /^string\.(criteria\.pollution|creepageRequiredMm)$/,
    /^pollution\.|^atmosphere\.altitude-factor:creepage|^string\.units-by-creepage|^string\.count:pollution/,
  ],
  [/^string\.creepageVoltageKv$/, /^pollution\.voltage/],
  [/^string\.creepageProvidedMm$/, /^string\.(creepage-provided|units$)/],
  [
    /^string\.uscdRequiredMmPerKv$/,
    /^pollution\.|^atmosphere\.altitude-factor:creepage|^string\.specific-creepage:uscd-required/,
  ],
  [/^string\.uscdProvidedMmPerKv$/, /^string\.(creepage-provided|specific-creepage:uscd-provided)|^pollution\.voltage/],
  [/^string\.scd1986RequiredMmPerKvUm$/, /^string\.specific-creepage:scd1986-required/],
  [/^string\.scd1986ProvidedMmPerKvUm$/, /^string\.specific-creepage:scd1986-provided/],
  [
    /^string\.criteria\.lightning$/,
    /:(string-)?lightning$|^string\.gap-factor|^air-gaps\.fast-front-gap-factor:string|^air-gaps\.lightning-dry-arc/,
  ],
  [
    /^string\.criteria\.switching$/,
    /:(string-)?switching$|^string\.gap-factor|^air-gaps\.insulator-gap-factor:string|^air-gaps\.switching-dry-arc/,
  ],
  [/^string\.criteria\.power-frequency$/, /:(string-)?power-frequency$|^string\.wet-flashover/],
  [
    /^string\.criteria\.minimum$/,
    /:minimum$|^string\.(company-minimum|suspension-level|minimum-|units-in-thin-air)|^atmosphere\.dielectric-factor/,
  ],
  [/^string\.units$/, /^string\.(count|extra-units|units$|minimum-units)/],
  [/^string\.sectionLengthMm$/, /^string\.section-length/],
  [/^string\.stringLengthWithFittings$/, /^string\.(spacing-tolerance|section-length|length)/],
  [/^string\.dryArcRequiredMm$/, /^air-gaps\.(lightning|switching)-dry-arc|^air-gaps\.fifty-percent-voltage/],
  [/^string\.(voltageSharing|efficiencyPercent)$/, /^string-voltage\./],
  [/^mechanical\.class$/, /^mechanical\.(class|strength)/],
  [/^string\.coordination$/, /^string\.external-clearance/],
  [/^string\.testLevels\.lightning$/, /^(string\.test-level|atmosphere\.altitude-factor):(string-)?lightning$/],
  [/^string\.testLevels\.switching$/, /^(string\.test-level|atmosphere\.altitude-factor):(string-)?switching$/],
  [
    /^string\.testLevels\.power-frequency$/,
    /^(string\.test-level|atmosphere\.altitude-factor):(string-)?power-frequency$/,
  ],
  [/^clearances\.phaseToEarthMm$/, /^clearances\.(phaseToEarthMm|row:[^:]+:phase-to-earth:)/],
  [/^clearances\.phaseToPhaseMm$/, /^clearances\.(phaseToPhaseMm|row:[^:]+:phase-to-phase:)/],
];

/** A test level is no criterion: its own line shows it, the count's lines do not. */
const NOT_OF_CRITERIA = /^string\.test-level/;

const ROW = 'clearances.row:';
const CASE = 'mechanical.case-';
const DISTANCE_WORDS: Record<string, string> = {
  'phase-to-earth': 'phase to earth',
  'phase-to-phase': 'between phases',
};

/** Name of the figure of a row of distances, as the last line of its working has it. */
export function clearanceName({
  method,
  distance,
  stress,
  shape,
}: Pick<ClearanceRow, 'method' | 'distance' | 'stress' | 'shape'>): string {
  return ROW + [method, distance, stress, ...(shape === null ? [] : [shape])].join(':');
}

/** Name of the loads of a case, by its place in the list. */
export const caseName = (index: number): string => `${CASE}${index + 1}`;

function isOfCase(name: string, id: string): boolean {
  const use = id.slice(id.indexOf(':') + 1);
  const own = name.slice('mechanical.'.length);
  return id.startsWith('mechanical.') && (use === own || use.startsWith(`${own}-`));
}

/** All lines of one row: what reads the table or the formula, the altitude, and the distance itself. */
function isOfRow(name: string, id: string): boolean {
  if (id === name) return true;
  const [method = '', distance = '', stress = '', shape] = name.slice(ROW.length).split(':');
  const use = id.slice(id.indexOf(':') + 1);
  const words = DISTANCE_WORDS[distance] ?? distance;
  if (method === 'iec-table' && distance !== 'safety') {
    return (
      use === [distance, stress, shape].join(':') ||
      use === `clearance ${words}, ${stress}, ${shape}` ||
      (id === 'overvoltage.switching-between-phases' && distance === 'phase-to-phase' && stress === 'switching')
    );
  }
  if (method === 'en-empirical') return use === `${distance}:${stress}` || use.startsWith(`${stress} ${words}`);
  const rest = [stress, ...(shape === undefined ? [] : [shape])].join(':');
  const uses = [`${method}:${distance}:${rest}`, `${method}:${distance}:${stress}`, `${method}:${stress}`];
  const isOfDecree = distance === 'safety' && use.startsWith('safety');
  return uses.includes(use) || isOfDecree;
}

export function hasTrace(name: string): boolean {
  return name.startsWith(ROW) || name.startsWith(CASE) || LINES.some(([figure]) => figure.test(name));
}

export function traceLinesOf(name: string, lines: readonly TraceLine[]): TraceLine[] {
  if (name.startsWith(ROW)) return lines.filter(({ id }) => isOfRow(name, id));
  if (name.startsWith(CASE)) return lines.filter(({ id }) => isOfCase(name, id));
  const wanted = LINES.filter(([figure]) => figure.test(name)).map(([, line]) => line);
  const isCriterion = name.startsWith('string.criteria.');
  return lines.filter(({ id }) => wanted.some((line) => line.test(id)) && !(isCriterion && NOT_OF_CRITERIA.test(id)));
}
