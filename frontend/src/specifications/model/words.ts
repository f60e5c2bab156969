import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import type { Criterion, Evaluation, InsulatorUnit, SpecificationInput } from '@bellgap/common/api';
import { levelWords } from './levels';
import type { InsulationLevelInput, LoadCaseInput } from '@bellgap/common/api';

const CHOICES: Record<string, Record<string, string>> = {
  kind: CHOICE_LABELS.kind,
  basis: CHOICE_LABELS.basis,
  'system.neutralEarthing': CHOICE_LABELS.neutralEarthing,
  'system.earthFault': CHOICE_LABELS.earthFault,
  'site.pollution.class': CHOICE_LABELS.pollutionClass,
  'site.pollution.type': CHOICE_LABELS.pollutionType,
  'site.pollution.contamination': CHOICE_LABELS.contamination,
  'site.pollution.basis': CHOICE_LABELS.pollutionBasis,
  'string.arrangement': CHOICE_LABELS.arrangement,
  'string.surroundings': CHOICE_LABELS.surroundings,
  'string.arcingDevices': CHOICE_LABELS.arcingDevices,
  'mechanical.basis': CHOICE_LABELS.mechanicalBasis,
  'mechanical.cases.kind': CHOICE_LABELS.loadCaseKind,
  'clearance.method': CHOICE_LABELS.clearanceMethod,
  'clearance.shapePhaseToEarth': CHOICE_LABELS.shapePhaseToEarth,
  'clearance.shapePhaseToPhase': CHOICE_LABELS.shapePhaseToPhase,
  'clearance.fastFrontFrom': CHOICE_LABELS.fastFrontFrom,
  'clearance.enGap': CHOICE_LABELS.enGap,
  'clearance.safetySource': CHOICE_LABELS.safetySource,
};

/** What a closed field shows where the full words are too long for it. */
const SHORT: Record<string, Record<string, string>> = {
  'system.neutralEarthing': { effective: 'Effective', resonant: 'Resonant', isolated: 'Isolated' },
  'system.earthFault': { cleared: 'Cleared', sustained: 'Sustained' },
  'site.pollution.type': { A: 'A, solid', B: 'B, fog, spray', AB: 'A and B' },
  'string.surroundings': { 'cross-arm': 'Cross-arm', window: 'Window', 'lower-structure': 'Below', open: 'Not known' },
  'clearance.method': {
    'iec-table': 'IEC tables',
    'en-empirical': 'EN empirical',
    'en-theoretical': 'EN theoretical',
    'north-american': 'N. American',
  },
  'clearance.shapePhaseToEarth': { 'rod-structure': 'Rod', 'conductor-structure': 'Conductor' },
  'clearance.shapePhaseToPhase': { 'rod-conductor': 'Rod', 'conductor-conductor': 'Conductors' },
  'clearance.fastFrontFrom': { level: 'Level', string: 'String' },
  'clearance.enGap': { window: 'Window', structure: 'Structure', obstacle: 'Obstacle' },
  'clearance.safetySource': { 'rd-337': 'RD 337/2014', 'iec-61936-1': 'IEC 61936-1' },
};

/** The choices of a field in the order and words in which they are offered. */
export function choicesOf(path: string): { value: string; label: string; short?: string }[] {
  return Object.entries(CHOICES[path.replace(/\[\d+\]/g, '')] ?? {}).map(([value, label]) => {
    const short = SHORT[path]?.[value];
    return short === undefined ? { value, label } : { value, label, short };
  });
}

/** A value of the input as it is read, with its unit. */
export function valueWords(path: string, value: unknown): string {
  if (value === null || value === undefined || value === '') return 'not known';
  if (path === 'system.insulationLevel') return levelWords(value as InsulationLevelInput) || 'not known';
  if (typeof value === 'boolean') return value ? CHOICE_LABELS.yesNo.yes : CHOICE_LABELS.yesNo.no;
  if (path === 'mechanical.cases') return caseListWords(value as LoadCaseInput[]);
  if (typeof value !== 'string' && typeof value !== 'number') return JSON.stringify(value);
  const choice = CHOICES[path]?.[value];
  if (choice !== undefined) return choice;
  const unit = fieldOf(path)?.unit;
  return unit === undefined ? String(value) : `${value} ${unit}`;
}

function caseListWords(cases: readonly LoadCaseInput[]): string {
  const figures = (one: LoadCaseInput): string =>
    Object.entries(one)
      .flatMap(([name, value]) =>
        typeof value === 'number' ? [`${fieldOf(`mechanical.cases.${name}`)?.label ?? name} ${value}`] : [],
      )
      .join(', ');
  return cases.map((one, index) => `${one.name ?? `case ${index + 1}`}: ${figures(one)}`).join('; ') || 'none';
}

/** Kind of string in words: "single suspension string, 160 kN, coupling 20". */
export function stringWords(input: SpecificationInput, unit: InsulatorUnit): string {
  const string = input.string;
  const words: string[] = [];
  if (unit.kind === 'line-post') return postWords(string, unit);
  if (string?.arrangement) {
    const many = string.parallelStrings;
    const count = many === 1 ? 'single ' : many === 2 ? 'double ' : many === null ? '' : `${many}-fold `;
    words.push(`${count}${CHOICE_LABELS.arrangement[string.arrangement].toLowerCase()} string`);
  }
  words.push(`${unit.failingLoadKn} kN`);
  if (unit.coupling) words.push(`coupling ${unit.coupling}`);
  return words.join(', ');
}

const bendingWords = ({ cantileverStrengthKn: strengthKn }: InsulatorUnit): string =>
  typeof strengthKn === 'number' ? `${strengthKn} kN in bending` : 'bending strength not known';

/** A post in words: "30° above the horizontal, 10 kN in bending, clamp". */
function postWords(string: SpecificationInput['string'], unit: InsulatorUnit): string {
  const angle = string?.postAngleDeg;
  const many = string?.parallelStrings ?? 1;
  return [
    many > 1 ? `${many} line posts in parallel` : 'line post',
    ...(typeof angle === 'number' ? [`${angle}° above the horizontal`] : []),
    bendingWords(unit),
    ...(unit.coupling ? [unit.coupling] : []),
  ].join(', ');
}

export function unitWords(unit: InsulatorUnit): string {
  const words: string[] = [];
  if (unit.material) words.push(CHOICE_LABELS.insulatorMaterial[unit.material].toLowerCase());
  words.push(`${CHOICE_LABELS.insulatorProfile[unit.profile].toLowerCase()} profile`);
  words.push(
    unit.diameterMm === null ? `length ${unit.spacingMm} mm` : `${unit.diameterMm} × ${unit.spacingMm} mm`,
    `${unit.creepageMm} mm creepage`,
    unit.kind === 'line-post' ? bendingWords(unit) : `${unit.failingLoadKn} kN`,
  );
  return words.join(', ');
}

export function criterionWords(criterion: Criterion): string {
  return CHOICE_LABELS.criterion[criterion];
}

/** "Pollution governs", "Pollution and lightning govern alike". */
export function governingWords({
  governedBy,
  tiedWith,
}: Pick<NonNullable<Evaluation['string']>, 'governedBy' | 'tiedWith'>) {
  if (governedBy === null) return null;
  const [first = '', ...others] = [governedBy, ...tiedWith.filter((one) => one !== governedBy)].map(criterionWords);
  if (others.length === 0) return `${first} governs`;
  const low = others.map((other) => other.toLowerCase());
  return `${[first, ...low.slice(0, -1)].join(', ')} and ${low.at(-1)} govern alike`;
}

/** Inputs that a count rests on and that are not known yet, by their labels. */
export function missingWords({ basis, system, site, string }: SpecificationInput): string | null {
  const pollution = site?.pollution;
  const severity = pollution && ('contamination' in pollution ? pollution.contamination : pollution.class);
  const needed: [path: string, value: unknown][] = [
    ['basis', basis],
    ['system.highestVoltageKv', system?.highestVoltageKv],
    ['system.neutralEarthing', system?.neutralEarthing],
    ['system.earthFault', system?.neutralEarthing === 'effective' ? true : system?.earthFault],
    ['system.insulationLevel', system?.insulationLevel],
    ['site.altitudeM', site?.altitudeM],
    [basis === 'north-american' ? 'site.pollution.contamination' : 'site.pollution.class', severity],
    ['string.insulatorCode', string?.insulatorCode],
    ['string.arrangement', string?.arrangement],
    ['string.surroundings', string?.surroundings],
    ['string.arcingDevices', string?.arcingDevices],
  ];
  const open = needed
    .filter(([, value]) => value === null || value === undefined)
    .map(([path]) => fieldOf(path)?.label.toLowerCase());
  if (open.length === 0) return null;
  return `Still to fill in: ${open.join(', ')}`;
}

/** Why a part of the answer has no figure. */
export function whyNot({ notAssessed }: Evaluation, ...parts: string[]): string | undefined {
  return notAssessed.find(({ part }) => parts.some((name) => part === name || part.startsWith(`${name}.`)))?.why;
}
