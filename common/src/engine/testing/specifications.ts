import type {
  CompanySettings,
  EvaluationContext,
  InsulationLevelInput,
  InsulatorUnit,
  SpecificationInput,
  StringInput,
} from '../model';

/** Builders for tests and for known answers: fixed defaults, overrides by name. */

const SOURCE = { document: 'Test catalogue', edition: '1', clause: 'invented', status: 'practice' } as const;

/** A standard disc of 146 mm spacing and 295 mm creepage: the size of U120B of IEC 60305. */
export function aDisc(overrides: Partial<InsulatorUnit> = {}): InsulatorUnit {
  return {
    code: 'U120B',
    version: 1,
    family: 'iec-60305',
    kind: 'cap-and-pin',
    material: 'glass',
    profile: 'standard',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 255,
    averageDiameterMm: null,
    creepageMm: 295,
    creepageIsNominal: false,
    dryArcMm: null,
    massKg: 4,
    routineTestLoadKn: null,
    wetFlashover: null,
    note: null,
    source: SOURCE,
    withdrawn: false,
    ...overrides,
  };
}

/** The composite rod C120-220 of the demo catalogue. */
export function aCompositeRod(overrides: Partial<InsulatorUnit> = {}): InsulatorUnit {
  return aDisc({
    code: 'C120-220',
    family: 'company',
    kind: 'composite-rod',
    material: 'composite',
    profile: 'alternating',
    spacingMm: 2270,
    diameterMm: null,
    creepageMm: 7600,
    dryArcMm: 2000,
    massKg: 8.9,
    ...overrides,
  });
}

export function aCeramicRod(overrides: Partial<InsulatorUnit> = {}): InsulatorUnit {
  return aCompositeRod({
    code: 'L160',
    kind: 'ceramic-rod',
    material: 'ceramic',
    profile: 'standard',
    spacingMm: 1270,
    averageDiameterMm: 150,
    creepageMm: 3900,
    dryArcMm: 1050,
    massKg: 40,
    ...overrides,
  });
}

export function companySettings(overrides: Partial<CompanySettings> = {}): CompanySettings {
  return {
    version: 1,
    tensionExtraUnits: 1,
    creepageAltitudeOriginM: 1000,
    altitudeStepM: 100,
    companyMinimumUnits: [],
    spareSharePercent: 3,
    maximumStringKinds: 6,
    ruleCards: [],
    insulationLevels: [],
    ...overrides,
  };
}

export function aContext(overrides: Partial<EvaluationContext> = {}): EvaluationContext {
  return { insulator: aDisc(), settings: companySettings(), confirmations: [], ...overrides };
}

export function rangeOneLevel(
  powerFrequencyKv: number | null,
  lightningKv: number,
  overrides: Partial<InsulationLevelInput> = {},
): InsulationLevelInput {
  return { lightningKv, powerFrequencyKv, switchingKv: null, switchingPhaseRatio: null, ...overrides };
}

export function rangeTwoLevel(
  switchingKv: number,
  switchingPhaseRatio: number,
  lightningKv: number,
): InsulationLevelInput {
  return { lightningKv, powerFrequencyKv: null, switchingKv, switchingPhaseRatio };
}

interface LineOverrides {
  system?: Partial<NonNullable<SpecificationInput['system']>>;
  site?: Partial<NonNullable<SpecificationInput['site']>>;
  string?: Partial<StringInput> | null;
  clearance?: SpecificationInput['clearance'];
}

/** An ordinary 132 kV suspension string on a light site, everything filled in. */
export function aLine(
  { system, site, string, clearance }: LineOverrides = {},
  overrides: Partial<SpecificationInput> = {},
): SpecificationInput {
  return {
    kind: 'line',
    basis: 'iec',
    system: {
      nominalVoltageKv: 132,
      highestVoltageKv: 145,
      frequencyHz: 50,
      neutralEarthing: 'effective',
      earthFault: null,
      insulationLevel: rangeOneLevel(275, 650),
      ...system,
    },
    site: {
      altitudeM: 300,
      pollution: { class: 'b', type: 'A', basis: 'measured', recheckBy: null },
      ...site,
    },
    string:
      string === null
        ? null
        : {
            insulatorCode: 'U120B',
            arrangement: 'suspension',
            parallelStrings: 1,
            surroundings: 'cross-arm',
            spareUnits: 0,
            arcingDevices: 'none',
            arcGapMm: null,
            ...string,
          },
    ...(clearance === undefined ? {} : { clearance }),
    ...overrides,
  };
}

export function aNorthAmericanLine(overrides: Partial<SpecificationInput> = {}): SpecificationInput {
  return aLine(
    {
      system: { nominalVoltageKv: 138, highestVoltageKv: 145, insulationLevel: rangeOneLevel(null, 650) },
      site: { pollution: { contamination: 'light', basis: 'estimated', recheckBy: null } },
      string: { insulatorCode: '52-3' },
    },
    { basis: 'north-american', ...overrides },
  );
}

/** The suspension unit 52-3 of ANSI C29.2. */
export function aSuspensionUnit(overrides: Partial<InsulatorUnit> = {}): InsulatorUnit {
  return aDisc({ code: '52-3', family: 'ansi-c29.2', diameterMm: 254, creepageMm: 292, ...overrides });
}
