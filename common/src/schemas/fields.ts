import type { SharingRatio, StringResult } from '../engine/model';

/**
 * Every input by its path: the words, unit and limits that the form, the sheet and the error messages share.
 * `quantity` says what the reader's choice of units may convert on screen; `unit` is the unit of the stored figure.
 */
export interface Field {
  label: string;
  /** Basis of a voltage, shown beside every kV. */
  basis?: 'line to line' | 'phase to earth';
  unit?:
    'kV rms' | 'kV peak' | 'kV' | 'm' | 'mm' | 'Hz' | 'kA' | 's' | '°' | 'N' | 'N/m' | 'Pa' | '°C' | 'kN' | 'kg/m³';
  quantity?: 'length-mm' | 'length-m' | 'force-kn' | 'force-n';
  /** Smallest figure that can be read at all; the method's own limits are the engine's. */
  above?: number;
  atLeast?: number;
  atMost?: number;
  whole?: boolean;
}

export const FIELDS = {
  kind: { label: 'Kind' },
  basis: { label: 'Basis' },
  'system.nominalVoltageKv': { label: 'Nominal voltage', basis: 'line to line', unit: 'kV rms', above: 0 },
  'system.highestVoltageKv': { label: 'Highest voltage', basis: 'line to line', unit: 'kV rms', above: 0 },
  'system.frequencyHz': { label: 'Frequency', unit: 'Hz', above: 0 },
  'system.neutralEarthing': { label: 'Neutral earthing' },
  'system.earthFault': { label: 'Earth fault' },
  'system.insulationLevel': { label: 'Insulation level' },
  'system.insulationLevel.lightningKv': { label: 'Lightning impulse withstand', unit: 'kV peak', above: 0 },
  'system.insulationLevel.switchingKv': {
    label: 'Switching impulse withstand',
    basis: 'phase to earth',
    unit: 'kV peak',
    above: 0,
  },
  'system.insulationLevel.powerFrequencyKv': { label: 'Power-frequency withstand', unit: 'kV rms', above: 0 },
  'system.insulationLevel.switchingPhaseRatio': { label: 'Switching, between phases over to earth', above: 0 },
  'system.insulationLevel.levelHoldsToM': { label: 'Level holds up to', unit: 'm', quantity: 'length-m', atLeast: 0 },
  'system.overvoltages.slowFrontPhaseToEarthKvPeak': {
    label: 'Slow-front overvoltage',
    basis: 'phase to earth',
    unit: 'kV peak',
    above: 0,
  },
  'system.overvoltages.slowFrontPhaseToPhaseKvPeak': {
    label: 'Slow-front overvoltage between phases',
    unit: 'kV peak',
    above: 0,
  },
  'system.overvoltages.earthFaultFactor': { label: 'Earth-fault factor', atLeast: 1 },
  'system.faultCurrentKa': { label: 'Fault current', unit: 'kA', above: 0 },
  'system.faultDurationS': { label: 'Fault duration', unit: 's', above: 0 },
  'site.altitudeM': { label: 'Altitude', unit: 'm', quantity: 'length-m', atLeast: -430 },
  'site.pollution.class': { label: 'Pollution class' },
  'site.pollution.type': { label: 'Pollution type' },
  'site.pollution.contamination': { label: 'Contamination level' },
  'site.pollution.basis': { label: 'How known' },
  'site.pollution.recheckBy': { label: 'Re-check by' },
  'string.insulatorCode': { label: 'Insulator unit' },
  'string.arrangement': { label: 'Arrangement' },
  'string.parallelStrings': { label: 'Strings in parallel', atLeast: 1, atMost: 4, whole: true },
  'string.rodsInSeries': { label: 'Rods in series', atLeast: 1, atMost: 10, whole: true },
  'string.surroundings': { label: 'Surroundings' },
  'string.spareUnits': { label: 'Extra units in the string', atLeast: 0, atMost: 20, whole: true },
  'string.arcingDevices': { label: 'Arcing devices' },
  'string.arcGapMm': { label: 'Gap between devices', unit: 'mm', quantity: 'length-mm', above: 0 },
  'string.hardwareLengthMm': { label: 'Length of fittings', unit: 'mm', quantity: 'length-mm', atLeast: 0 },
  'string.vAngleWindwardDeg': { label: 'V leg angle, windward', unit: '°', above: 0, atMost: 89 },
  'string.vAngleLeewardDeg': { label: 'V leg angle, leeward', unit: '°', above: 0, atMost: 89 },
  'string.postAngleDeg': { label: 'Post above the horizontal', unit: '°', atLeast: 0, atMost: 90 },
  'string.sharing.pinToEarthRatio': { label: 'Pin to earth over self capacitance, c', atLeast: 0, atMost: 1 },
  'string.sharing.pinToLineRatio': { label: 'Pin to line over self capacitance, k', atLeast: 0, atMost: 1 },
  'clearance.method': { label: 'Clearance method' },
  'clearance.shapePhaseToEarth': { label: 'Shape, phase to earth' },
  'clearance.shapePhaseToPhase': { label: 'Shape, between phases' },
  'clearance.fastFrontFrom': { label: 'Fast-front voltage from' },
  'clearance.enGap': { label: 'Kind of gap' },
  'clearance.externalClearanceMm': {
    label: 'External clearance provided',
    unit: 'mm',
    quantity: 'length-mm',
    above: 0,
  },
  'clearance.safetySource': { label: 'Safety distances from' },
  mechanical: { label: 'Mechanical loads' },
  'mechanical.basis': { label: 'Strength basis' },
  'mechanical.subconductors': { label: 'Sub-conductors', atLeast: 1, atMost: 12, whole: true },
  'mechanical.crossing': { label: 'Crossing' },
  'mechanical.acceptedStatistically': { label: 'Batch accepted statistically' },
  'mechanical.windSpanM': { label: 'Wind span', unit: 'm', quantity: 'length-m', atLeast: 0 },
  'mechanical.weightSpanM': { label: 'Weight span', unit: 'm', quantity: 'length-m' },
  'mechanical.lineAngleDeg': { label: 'Line angle', unit: '°', atLeast: -180, atMost: 180 },
  'mechanical.fittingsStrengthKn': { label: 'Strength of the fittings', unit: 'kN', quantity: 'force-kn', above: 0 },
  'mechanical.cases': { label: 'Load cases' },
  'mechanical.cases.name': { label: 'Name' },
  'mechanical.cases.kind': { label: 'Kind of case' },
  'mechanical.cases.conductorWeightNPerM': { label: 'Conductor weight', unit: 'N/m', above: 0 },
  'mechanical.cases.windPressurePa': { label: 'Wind pressure', unit: 'Pa', atLeast: 0 },
  'mechanical.cases.conductorDiameterMm': {
    label: 'Conductor diameter',
    unit: 'mm',
    quantity: 'length-mm',
    above: 0,
  },
  'mechanical.cases.iceRadialMm': { label: 'Ice all round', unit: 'mm', quantity: 'length-mm', atLeast: 0 },
  'mechanical.cases.iceDensityKgPerM3': { label: 'Density of the ice', unit: 'kg/m³', above: 0 },
  'mechanical.cases.conductorTensionN': { label: 'Conductor tension', unit: 'N', quantity: 'force-n', atLeast: 0 },
  'mechanical.cases.stringWindN': { label: 'Wind on the string', unit: 'N', quantity: 'force-n', atLeast: 0 },
  'mechanical.cases.stringWeightN': { label: 'Weight of the string', unit: 'N', quantity: 'force-n', atLeast: 0 },
  'mechanical.cases.hardwareWeightN': { label: 'Weight of the fittings', unit: 'N', quantity: 'force-n', atLeast: 0 },
} as const satisfies Record<string, Field>;

export type FieldPath = keyof typeof FIELDS;

/**
 * The field of a path, or undefined where the path names none. Widened, so that every property can be asked. Rows of a
 * list share their fields: "mechanical.cases[2].kind" is that of "mechanical.cases.kind".
 */
export function fieldOf(path: string): Field | undefined {
  return (FIELDS as Record<string, Field>)[path.replace(/\[\d+\]/g, '')];
}

/** The words of every choice, by field name. */
export const CHOICE_LABELS = {
  kind: { line: 'Line', bay: 'Substation bay' },
  basis: { iec: 'IEC', 'north-american': 'North American' },
  frequencyHz: { '50': '50 Hz', '60': '60 Hz' },
  neutralEarthing: { effective: 'Effectively earthed', resonant: 'Resonant earthed', isolated: 'Isolated' },
  earthFault: { cleared: 'Cleared at once', sustained: 'May stand for hours' },
  pollutionClass: { a: 'a, very light', b: 'b, light', c: 'c, medium', d: 'd, heavy', e: 'e, very heavy' },
  pollutionType: { A: 'A, solid deposit', B: 'B, conductive fog or spray', AB: 'A and B' },
  pollutionBasis: { measured: 'Measured', estimated: 'Estimated', assumed: 'Assumed' },
  contamination: {
    'very-light': 'Very light',
    light: 'Light',
    moderate: 'Moderate',
    heavy: 'Heavy',
    'very-heavy': 'Very heavy',
  },
  arrangement: { suspension: 'Suspension', 'v-suspension': 'V-suspension', tension: 'Tension' },
  surroundings: {
    'cross-arm': 'At the cross-arm',
    window: 'In the tower window',
    'lower-structure': 'Structure below',
    open: 'Not known',
  },
  arcingDevices: { none: 'None', horns: 'Horns', rings: 'Rings' },
  clearanceMethod: {
    'iec-table': 'IEC 60071 tables',
    'en-empirical': 'EN 50341 empirical',
    'en-theoretical': 'EN 50341 theoretical',
    'north-american': 'North American',
  },
  shapePhaseToEarth: { 'rod-structure': 'Rod to structure', 'conductor-structure': 'Conductor to structure' },
  shapePhaseToPhase: { 'rod-conductor': 'Rod to conductor', 'conductor-conductor': 'Conductor to conductor' },
  fastFrontFrom: { level: 'Insulation level', string: 'String' },
  enGap: { window: 'Tower window', structure: 'Tower structure', obstacle: 'Obstacle' },
  safetySource: { 'rd-337': 'RD 337/2014 ITC-RAT 15', 'iec-61936-1': 'IEC 61936-1' },
  mechanicalBasis: {
    'rd-223': 'RD 223/2008',
    'en-50341': 'EN 50341-1',
    nesc: 'NESC',
    rus: 'RUS 1724E-200',
  },
  loadCaseKind: {
    everyday: 'Everyday',
    wind: 'Wind',
    ice: 'Ice',
    district: 'District load',
    extreme: 'Extreme wind or ice',
    'broken-string': 'One string broken',
  },
  safetyKind: {
    'mesh-or-screen': 'Behind mesh or screen',
    'indoor-obstacle': 'Behind an obstacle, indoors',
    'outdoor-obstacle': 'Behind an obstacle, outdoors',
    'boundary-wall': 'Inside a boundary wall',
    'boundary-mesh': 'Inside a boundary mesh',
    'height-over-access': 'Height over access areas',
    vehicle: 'Beside vehicles and loads',
    'insulator-base-height': 'Height of the insulator base',
    'height-outside-boundary': 'Height outside the boundary',
  },
  yesNo: { yes: 'Yes', no: 'No' },
  ratioOrigin: { entered: 'entered', usual: 'usual, practice' },
  bridgeCause: {
    'rule-to-method': 'Rule to method',
    pollution: 'Pollution',
    'earth-fault': 'Earth fault',
    altitude: 'Altitude',
    'insulation-level': 'Insulation level',
    surroundings: 'Surroundings',
    'arcing-devices': 'Arcing devices',
    unit: 'Unit',
    minimum: 'Minimum',
    'extra-units': 'Extra units',
  },
  insulatorKind: {
    'cap-and-pin': 'Cap and pin',
    'ceramic-rod': 'Ceramic long rod',
    'composite-rod': 'Composite long rod',
    'line-post': 'Line post',
  },
  insulatorMaterial: { glass: 'Toughened glass', porcelain: 'Porcelain', ceramic: 'Ceramic', composite: 'Composite' },
  insulatorProfile: {
    standard: 'Standard',
    fog: 'Fog',
    open: 'Open',
    alternating: 'Alternating sheds',
    unknown: 'Not known',
  },
  insulatorFamily: { 'iec-60305': 'IEC 60305', 'ansi-c29.2': 'ANSI C29.2', company: 'Company catalogue' },
  criterion: {
    pollution: 'Pollution',
    lightning: 'Lightning',
    switching: 'Switching',
    'power-frequency': 'Power frequency, wet',
    minimum: 'Minimum',
  },
  verdict: { met: 'Met', short: 'Short', unknown: 'Unknown' },
  severity: { info: 'Note', caution: 'Caution', acceptance: 'Acceptance', fail: 'Fail', stop: 'Stop' },
  status: {
    seen: 'seen',
    memory: 'from memory, not verified',
    practice: 'common practice, no published source',
    derived: 'derived',
    confirmed: 'confirmed',
    disputed: 'disputed',
  },
} as const;

/** What the voltage sharing rests on, in words that screen and sheet share. */
export function sharingWords({ pinToEarth, pinToLine }: NonNullable<StringResult['sharing']>): string {
  const words = ({ valueRatio, from }: SharingRatio, where: string): string =>
    `${valueRatio} ${where} (${CHOICE_LABELS.ratioOrigin[from]})`;
  return `Over the self capacitance of a unit: c = ${words(pinToEarth, 'to earth')}, k = ${words(pinToLine, 'to the line')}.`;
}
