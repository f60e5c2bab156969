import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Status } from '../../src/engine/model';
import * as standards from '../../src/engine/standards';
import type { StandardTable } from '../../src/engine/standards';

/** Comma-separated text with quoted cells; lines that start with # are the head. */
function readCsv(file: string): Record<string, string>[] {
  const text = readFileSync(join(__dirname, 'tables', `${file}.csv`), 'utf8');
  const [heads = [], ...rows] = text
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map((line) =>
      [...line.matchAll(/(?:^|,)(?:"((?:[^"]|"")*)"|([^,]*))/g)].map(([, quoted, plain]) => quoted ?? plain ?? ''),
    );
  return rows.map((cells) => {
    if (cells.length !== heads.length) throw new Error(`${file}: ${cells.join()}`);
    return Object.fromEntries(heads.map((head, index) => [head, cells[index] ?? '']));
  });
}

/** The status that the words of a table stand for. */
function statusOf(words: string): Status | null {
  if (words === '' || words === 'not applicable') return null;
  if (/^seen (by formula|by composition|indirectly)/.test(words)) return 'derived';
  if (words.startsWith('seen as upper bound only') || words.startsWith('from memory')) return 'memory';
  if (words.startsWith('seen')) return 'seen';
  throw new Error(`no status for "${words}"`);
}

type Cell = (text: string, row: Record<string, string>) => unknown;
const number: Cell = (text) => (text === '' ? null : Number(text));
const words: Cell = (text) => (text === '' ? null : text);
/** Words joined by underscores in the file; the weather of a condition is left out. */
const hyphens: Cell = (text) => text.replace('_6psf', '').replaceAll('_', '-');
const yes: Cell = (text) => text === 'yes';
const status: Cell = (text) => statusOf(text);
const numbers: Cell = (text) => (text === '' ? null : text.split('/').map(Number));
const tradeStatus: Cell = (text, row) => (row.source?.startsWith('common practice') ? 'practice' : statusOf(text));

type Columns = Record<string, readonly [csvColumn: string, read: Cell]>;
const transcribed = (file: string, table: StandardTable<object>, columns: Columns) => ({ file, table, columns });

/** Every column of every table, with the column of the file that it was typed from. */
const TRANSCRIPTIONS = [
  transcribed('iec-60071-1-range-i', standards.IEC_60071_1_RANGE_I, {
    highestVoltageKv: ['um_kv', number],
    powerFrequencyKv: ['sdwv_kv_rms', number],
    lightningKv: ['liwv_kv_peak', number],
    bracketed: ['bracketed', yes],
    status: ['status', status],
  }),
  transcribed('iec-60071-1-range-ii', standards.IEC_60071_1_RANGE_II, {
    highestVoltageKv: ['um_kv', number],
    longitudinalKv: ['siwv_longitudinal_kv_peak', number],
    switchingKv: ['siwv_pe_kv_peak', number],
    switchingPhaseRatio: ['pp_ratio', number],
    switchingPhaseToPhaseKv: ['siwv_pp_kv_peak', number],
    lightningKv: ['liwv_kv_peak', number],
    status: ['status', status],
    statusRatio: ['status_ratio', status],
  }),
  transcribed('iec-60071-1-a1', standards.IEC_60071_1_TABLE_A1, {
    lightningKv: ['liwv_kv_peak', number],
    rodStructureMm: ['rod_structure_mm', number],
    conductorStructureMm: ['conductor_structure_mm', number],
    status: ['status_rod_structure', status],
    statusConductorStructure: ['status_conductor_structure', status],
  }),
  transcribed('iec-60071-1-a2', standards.IEC_60071_1_TABLE_A2, {
    switchingKv: ['siwv_pe_kv_peak', number],
    conductorStructureMm: ['conductor_structure_mm', number],
    rodStructureMm: ['rod_structure_mm', number],
    status: ['status_rod_structure', status],
    statusConductorStructure: ['status_conductor_structure', status],
  }),
  transcribed('iec-60071-1-a3', standards.IEC_60071_1_TABLE_A3, {
    switchingKv: ['siwv_pe_kv_peak', number],
    switchingPhaseRatio: ['pp_ratio', number],
    switchingPhaseToPhaseKv: ['siwv_pp_kv_peak', number],
    conductorConductorMm: ['conductor_conductor_parallel_mm', number],
    rodConductorMm: ['rod_conductor_mm', number],
    status: ['status_rod_conductor', status],
    statusConductorConductor: ['status', status],
  }),
  transcribed('iec-ts-60815-uscd', standards.IEC_TS_60815_USCD, {
    pollutionClass: ['sps_class', words],
    className: ['sps_name', words],
    uscdMmPerKv: ['ruscd_mm_per_kv_phase_earth', number],
    scd1986MmPerKvUm: ['scd_1986_mm_per_kv_phase_phase', number],
    level1986: ['level_1986', words],
    status: ['status', status],
  }),
  transcribed('iec-ts-60815-profile', standards.PROFILE_LIMITS, {
    parameter: ['parameter', words],
    appliesTo: ['applies_to', words],
    leastRatio: ['least_ratio', number],
    mostRatio: ['most_ratio', number],
    leastMm: ['least_mm', number],
    status: ['status', status],
  }),
  transcribed('iec-60305-units', standards.IEC_60305_UNITS, {
    designation: ['designation', words],
    failingLoadKn: ['failing_load_kn', number],
    diameterMaximumMm: ['diameter_max_mm', number],
    spacingMm: ['spacing_mm', number],
    creepageMinimumMm: ['creepage_min_mm', number],
    couplingIec60120: ['coupling_iec60120', words],
    profile: ['profile', words],
    status: ['status', status],
  }),
  transcribed('ansi-c29-2-units', standards.ANSI_C29_2_UNITS, {
    ansiClass: ['ansi_class', words],
    coupling: ['coupling', words],
    spacingIn: ['spacing_in', number],
    spacingMm: ['spacing_mm', number],
    diameterIn: ['diameter_in', number],
    diameterMm: ['diameter_mm', number],
    leakageIn: ['leakage_in', number],
    leakageMm: ['leakage_mm', number],
    strengthLb: ['me_strength_lb', number],
    strengthKn: ['me_strength_kn', number],
    dryFlashoverKv: ['dry_flashover_kv_rms', number],
    wetFlashoverKv: ['wet_flashover_kv_rms', number],
    impulsePositiveKv: ['impulse_positive_kv_peak', number],
    impulseNegativeKv: ['impulse_negative_kv_peak', number],
    punctureKv: ['puncture_kv_rms', number],
    status: ['status', status],
  }),
  transcribed('iec-60433-classes', standards.IEC_60433_CLASSES, {
    failingLoadKn: ['failing_load_kn', number],
    couplingIec60120: ['ball_socket', words],
    status: ['status', status],
  }),
  transcribed('iec-61466-1-classes', standards.IEC_61466_1_CLASSES, {
    failingLoadKn: ['sml_kn', number],
    couplingIec60120: ['ball_socket', words],
    clevisTongue: ['clevis_tongue', words],
    yClevis: ['y_clevis', words],
    eye: ['eye', words],
    status: ['status', status],
  }),
  transcribed('insulator-strength', standards.INSULATOR_STRENGTH, {
    rule: ['rule', words],
    insulator: ['insulator', words],
    action: ['action', words],
    loadCase: ['load_case', words],
    maximumRatio: ['max_fraction_of_rating', number],
    status: ['status', status],
  }),
  transcribed('string-flashover-254x146', standards.STRING_FLASHOVER_254X146, {
    units: ['units', number],
    stringLengthMm: ['string_length_mm', number],
    dryKvRms: ['dry_60hz_kv_rms', number],
    wetKvRms: ['wet_60hz_kv_rms', number],
    impulsePositiveKvPeak: ['impulse_50pct_positive_kv_peak', number],
    impulseNegativeKvPeak: ['impulse_50pct_negative_kv_peak', number],
    status: ['status', status],
  }),
  transcribed('en-50341-1-clearances', standards.EN_50341_1_CLEARANCES, {
    highestVoltageKv: ['us_kv', number],
    delM: ['del_m', number],
    dppM: ['dpp_m', number],
    d50HzPhaseToEarthM: ['d50hz_pe_m', number],
    d50HzPhaseToPhaseM: ['d50hz_pp_m', number],
    status: ['status_del_dpp', status],
    statusD50Hz: ['status_d50hz', status],
  }),
  transcribed('en-50341-1-altitude', standards.EN_50341_1_ALTITUDE, {
    altitudeM: ['altitude_m', number],
    upTo200KvFactor: ['ka_up_to_200_kv', number],
    upTo400KvFactor: ['ka_201_400_kv', number],
    upTo700KvFactor: ['ka_401_700_kv', number],
    upTo1100KvFactor: ['ka_701_1100_kv', number],
    above1100KvFactor: ['ka_above_1100_kv', number],
    status: ['status', status],
  }),
  transcribed('en-50341-1-gap-factors', standards.EN_50341_1_GAP_FACTORS, {
    gap: ['gap', words],
    configuration: ['configuration', words],
    slowFrontGapFactor: ['kg_sf', number],
    status: ['status', status],
  }),
  transcribed('rus-1724e-200-suspension-levels', standards.RUS_SUSPENSION_LEVELS, {
    nominalVoltageKv: ['nominal_voltage_kv', number],
    maximumVoltageKv: ['max_operating_voltage_kv', number],
    statusMaximumVoltage: ['max_operating_voltage_status', status],
    units: ['suspension_units_254x146', number],
    dryKvRms: ['dry_60hz_flashover_kv_rms', number],
    wetKvRms: ['wet_60hz_flashover_kv_rms', number],
    impulsePositiveKvPeak: ['impulse_50pct_positive_kv_peak', number],
    impulseNegativeKvPeak: ['impulse_50pct_negative_kv_peak', number],
    leakageIn: ['leakage_in', number],
    leakageFt: ['leakage_ft', number],
    status: ['status', status],
  }),
  transcribed('rus-1724e-200-contamination', standards.RUS_CONTAMINATION, {
    rowSet: ['row_set', words],
    contamination: ['contamination_level', words],
    esddMinimumMgPerCm2: ['esdd_min_mg_cm2', number],
    esddMaximumMgPerCm2: ['esdd_max_mg_cm2', number],
    leakageMinimumInPerKv: ['leakage_min_in_per_kv_lg', number],
    leakageMaximumInPerKv: ['leakage_max_in_per_kv_lg', number],
    stringType: ['string_type', words],
    status: ['status', status],
  }),
  transcribed('c37-30-altitude', standards.C37_30_ALTITUDE, {
    altitudeFt: ['altitude_ft', number],
    altitudeM: ['altitude_m', number],
    dielectricFactor: ['dielectric_factor', number],
    secondSourceFactor: ['nelson_1984_factor', number],
    status: ['status', status],
    statusSecondSource: ['nelson_status', status],
  }),
  transcribed('c37-32-bus-clearances', standards.C37_32_BUS_CLEARANCES, {
    ratedMaximumVoltageKv: ['rated_max_voltage_kv', number],
    bilKv: ['bil_kv_peak', number],
    metalToMetalIn: ['min_metal_to_metal_in', number],
    metalToMetalMm: ['min_metal_to_metal_mm', number],
    groundMinimumIn: ['ground_clearance_minimum_in', number],
    groundMinimumMm: ['ground_clearance_minimum_mm', number],
    groundRecommendedIn: ['ground_clearance_recommended_in', number],
    groundRecommendedMm: ['ground_clearance_recommended_mm', number],
    phaseSpacingIn: ['phase_spacing_vertical_break_and_bus_in', number],
    phaseSpacingMm: ['phase_spacing_vertical_break_and_bus_mm', number],
    status: ['status', status],
  }),
  transcribed('rus-1724e-200-swing-clearances', standards.RUS_SWING_CLEARANCES, {
    condition: ['condition', hyphens],
    nominalVoltageKv: ['nominal_voltage_kv', number],
    maximumVoltageKv: ['max_operating_voltage_kv', number],
    units: ['suspension_units_254x146', number],
    clearanceTo: ['clearance_to', hyphens],
    clearanceIn: ['rus_value_in', number],
    nescIn: ['nesc_table_235_6_value_in', number],
    nescRoundedUpIn: ['nesc_rounded_up_in', number],
    nescAdderIn: ['nesc_altitude_adder_in_per_1000ft', number],
    status: ['status', status],
    statusNesc: ['status_nesc', status],
  }),
  transcribed('safety-distances', standards.SAFETY_DISTANCES, {
    source: ['source', words],
    kind: ['kind', words],
    symbol: ['symbol', words],
    additionMm: ['addition_mm', number],
    leastMm: ['least_mm', number],
    overVoltageKv: ['um_over_kv', number],
    upToVoltageKv: ['um_up_to_kv', number],
    status: ['status', status],
  }),
  transcribed('national-altitude-rules', standards.NATIONAL_ALTITUDE_RULES, {
    rule: ['rule', words],
    title: ['title', words],
    appliesTo: ['applies_to', words],
    increasePercent: ['increase_percent', number],
    stepM: ['step_m', number],
    wholeSteps: ['whole_steps', yes],
    originM: ['origin_m', number],
    validUpToM: ['valid_up_to_m', number],
    at2000Factor: ['factor_2000m', number],
    at3000Factor: ['factor_3000m', number],
    status: ['status', status],
  }),
  transcribed('trade-disc-counts', standards.TRADE_DISC_COUNTS, {
    nominalVoltageKv: ['nominal_voltage_kv', number],
    discsMinimum: ['discs_min', number],
    discsMaximum: ['discs_max', number],
    origin: ['source', words],
    status: ['status', tradeStatus],
  }),
  transcribed('iec-61936-1-clearances', standards.IEC_61936_1_CLEARANCES, {
    range: ['range', words],
    highestVoltagesKv: ['um_kv', numbers],
    powerFrequencyKv: ['sdwv_kv_rms', number],
    lightningKv: ['liwv_kv_peak', numbers],
    switchingKv: ['siwv_pe_kv_peak', number],
    indoorMm: ['n_indoor_mm', number],
    outdoorMm: ['n_outdoor_mm', number],
    conductorStructureMm: ['n_conductor_structure_mm', numbers],
    rodStructureMm: ['n_rod_structure_mm', number],
    switchingPhaseToPhaseKv: ['siwv_pp_kv_peak', number],
    conductorConductorMm: ['pp_conductor_conductor_mm', number],
    rodConductorMm: ['pp_rod_conductor_mm', number],
    status: ['status', status],
    statusLevels: ['status_levels', status],
  }),
];

describe('check of transcription: the tables of the engine against the files they were typed from', () => {
  it('covers every table, each once', () => {
    expect(TRANSCRIPTIONS.map(({ table }) => table.key).sort()).toEqual(
      standards.ALL_TABLES.map(({ key }) => key).sort(),
    );
  });

  it.each(TRANSCRIPTIONS.map((transcription) => [transcription.file, transcription] as const))(
    '%s agrees cell by cell, in count and order of rows',
    (file, { table, columns }) => {
      const printed = readCsv(file);
      expect(printed.length).toBeGreaterThan(0);
      expect(Object.keys(printed[0] ?? {}).sort()).toEqual(
        Object.values(columns)
          .map(([column]) => column)
          .sort(),
      );
      const read = printed.map((row) =>
        Object.fromEntries(Object.entries(columns).map(([key, [column, cell]]) => [key, cell(row[column] ?? '', row)])),
      );
      expect(table.rows).toEqual(read);
    },
  );
});
