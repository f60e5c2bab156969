import type { Basis, EarthFault, SpecificationInput } from './model';
import { ALTITUDE_LIMITS_M, HIGHEST_VOLTAGE_LIMITS_KV, UNUSUAL_VOLTAGE_RATIO, isKnown, rangeOf } from './quantities';
import type { Calculation } from './trace';

/** The level of an input as the topics read it; null is not known. */
export interface SituationLevel {
  /** kV peak. */
  lightningKv: number | null;
  /** Phase to earth, kV peak. */
  switchingKv: number | null;
  /** Short duration, kV r.m.s. */
  powerFrequencyKv: number | null;
  switchingPhaseRatio: number | null;
  /** Altitude up to which the level was proved, m. */
  holdsToM: number;
}

/**
 * What every topic needs of an input, read once: figures that the method can work with, and where there is none, why.
 */
export interface Situation {
  basis: Basis | null;
  /** Un, line to line, kV r.m.s. */
  nominalVoltageKv: number | null;
  /** Um, line to line, kV r.m.s., 525 and 765 read as 550 and 800; null where not known or outside the method. */
  highestVoltageKv: number | null;
  highestVoltageWhyNot: string | null;
  /** Range of IEC 60071-1. */
  range: 1 | 2 | null;
  /** Altitude, m, not below 0; null where not known or outside the method. */
  altitudeM: number | null;
  altitudeWhyNot: string | null;
  earthFault: EarthFault | null;
  level: SituationLevel | null;
  /** True where a figure lies outside the method, so that nothing that depends on it has a figure. */
  stopped: boolean;
}

/** Um of editions before 2010 and the row that took their place. */
const OLDER_VOLTAGES: ReadonlyMap<number, number> = new Map([
  [525, 550],
  [765, 800],
]);

/** Um as the tables name it: 525 reads as 550, 765 as 800. */
export function readHighestVoltageKv(highestVoltageKv: number): number {
  return OLDER_VOLTAGES.get(highestVoltageKv) ?? highestVoltageKv;
}

export function isWithinVoltages(highestVoltageKv: number): boolean {
  return highestVoltageKv >= HIGHEST_VOLTAGE_LIMITS_KV.least && highestVoltageKv <= HIGHEST_VOLTAGE_LIMITS_KV.most;
}

function readVoltage(
  input: SpecificationInput,
  calculation: Calculation,
): Pick<Situation, 'highestVoltageKv' | 'highestVoltageWhyNot'> {
  const field = 'system.highestVoltageKv';
  const givenKv = input.system?.highestVoltageKv;
  const nominalKv = input.system?.nominalVoltageKv;
  if (!isKnown(givenKv))
    return { highestVoltageKv: null, highestVoltageWhyNot: 'The highest voltage is not filled in.' };
  if (!isWithinVoltages(givenKv)) {
    const { least, most } = HIGHEST_VOLTAGE_LIMITS_KV;
    const text = `The highest voltage of ${givenKv} kV lies outside the method, which covers ${least} to ${most} kV line to line.`;
    calculation.caution('voltage-outside-method', 'stop', text, field);
    return { highestVoltageKv: null, highestVoltageWhyNot: text };
  }
  const highestVoltageKv = readHighestVoltageKv(givenKv);
  if (highestVoltageKv !== givenKv) {
    const text = `The highest voltage of ${givenKv} kV is read as ${highestVoltageKv} kV, the row that took its place in 2010.`;
    calculation.caution('voltage-read-as', 'info', text, field);
  }
  if (isKnown(nominalKv) && givenKv / nominalKv > UNUSUAL_VOLTAGE_RATIO) {
    const text = `The highest voltage is more than ${UNUSUAL_VOLTAGE_RATIO} times the nominal voltage; look whether both are right.`;
    calculation.caution('voltage-ratio-unusual', 'caution', text, field);
  }
  return { highestVoltageKv, highestVoltageWhyNot: null };
}

function readAltitude(
  input: SpecificationInput,
  calculation: Calculation,
): Pick<Situation, 'altitudeM' | 'altitudeWhyNot'> {
  const field = 'site.altitudeM';
  const givenM = input.site?.altitudeM;
  if (!isKnown(givenM)) return { altitudeM: null, altitudeWhyNot: 'The altitude is not filled in.' };
  const { caution, acceptance, stop } = ALTITUDE_LIMITS_M;
  if (givenM > stop) {
    const text = `The altitude of ${givenM} m lies outside the method, which ends at ${stop} m.`;
    calculation.caution('altitude-outside-method', 'stop', text, field);
    return { altitudeM: null, altitudeWhyNot: text };
  }
  if (givenM > acceptance) {
    const text = `Above ${acceptance} m the corrections rest on few tests; the approver has to accept them for ${givenM} m.`;
    calculation.caution('altitude-over-3000', 'acceptance', text, field);
  } else if (givenM > caution) {
    const text = `Most sources of altitude corrections stop at ${caution} m; this site lies at ${givenM} m.`;
    calculation.caution('altitude-over-2000', 'caution', text, field);
  }
  return { altitudeM: Math.max(0, givenM), altitudeWhyNot: null };
}

function readEarthFault(input: SpecificationInput): EarthFault | null {
  const earthFault = input.system?.earthFault ?? null;
  if (input.system?.neutralEarthing !== 'effective') return earthFault;
  return earthFault === 'sustained' ? null : 'cleared';
}

function readLevel(input: SpecificationInput): SituationLevel | null {
  const level = input.system?.insulationLevel;
  if (!isKnown(level)) return null;
  return {
    lightningKv: level.lightningKv ?? null,
    switchingKv: level.switchingKv ?? null,
    powerFrequencyKv: level.powerFrequencyKv ?? null,
    switchingPhaseRatio: level.switchingPhaseRatio ?? null,
    holdsToM: level.levelHoldsToM ?? ALTITUDE_LIMITS_M.origin,
  };
}

/** Reads an input once for all topics, with the cautions that its voltage and altitude call for. */
export function readSituation(input: SpecificationInput, calculation: Calculation): Situation {
  const voltage = readVoltage(input, calculation);
  const altitude = readAltitude(input, calculation);
  return {
    basis: input.basis ?? null,
    nominalVoltageKv: input.system?.nominalVoltageKv ?? null,
    ...voltage,
    range: voltage.highestVoltageKv === null ? null : rangeOf(voltage.highestVoltageKv),
    ...altitude,
    earthFault: readEarthFault(input),
    level: readLevel(input),
    stopped: calculation.cautions.some(({ severity }) => severity === 'stop'),
  };
}
