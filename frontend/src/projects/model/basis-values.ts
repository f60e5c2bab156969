import type { DesignBasis } from '@bellgap/common/api';
import { levelOf, type Level } from './levels';
import { worksheetBody, worksheetValues, type WorksheetValues } from './worksheet-values';

/** A figure as the form holds it: read, empty, or text that could not be read. */
type Typed = number | string | null;

/** What the form of a design basis holds; the level is one row, chosen whole. */
export interface BasisValues {
  number: string;
  basis: string | null;
  system: {
    nominalVoltageKv: Typed;
    highestVoltageKv: Typed;
    frequencyHz: Typed;
    neutralEarthing: string | null;
    earthFault: string | null;
    level: Level | null;
    levelHoldsToM: Typed;
    overvoltages: {
      slowFrontPhaseToEarthKvPeak: Typed;
      slowFrontPhaseToPhaseKvPeak: Typed;
      earthFaultFactor: Typed;
    };
    faultCurrentKa: Typed;
    faultDurationS: Typed;
  };
  rules: { unitsOutForLiveWork: Typed; maximumStringKinds: Typed };
  worksheet: WorksheetValues;
  note: string;
}

/** Nothing is chosen beforehand; a next revision begins with what stands. */
export function basisValues(current: DesignBasis | null, number: string): BasisValues {
  const system = current?.system;
  const level = system?.insulationLevel ?? null;
  return {
    number: current?.number ?? number,
    basis: current?.basis ?? null,
    system: {
      nominalVoltageKv: system?.nominalVoltageKv ?? null,
      highestVoltageKv: system?.highestVoltageKv ?? null,
      frequencyHz: system?.frequencyHz ?? null,
      neutralEarthing: system?.neutralEarthing ?? null,
      earthFault: system?.earthFault ?? null,
      level: level && levelOf(level),
      levelHoldsToM: level?.levelHoldsToM ?? null,
      overvoltages: {
        slowFrontPhaseToEarthKvPeak: system?.overvoltages?.slowFrontPhaseToEarthKvPeak ?? null,
        slowFrontPhaseToPhaseKvPeak: system?.overvoltages?.slowFrontPhaseToPhaseKvPeak ?? null,
        earthFaultFactor: system?.overvoltages?.earthFaultFactor ?? null,
      },
      faultCurrentKa: system?.faultCurrentKa ?? null,
      faultDurationS: system?.faultDurationS ?? null,
    },
    rules: {
      unitsOutForLiveWork: current?.rules.unitsOutForLiveWork ?? null,
      maximumStringKinds: current?.rules.maximumStringKinds ?? null,
    },
    worksheet: worksheetValues(current?.worksheet),
    note: '',
  };
}

/** The body of the request: the level as the API has it, no overvoltages where none is known. */
export function basisBody({ number, basis, system, rules, worksheet, note }: BasisValues): unknown {
  const { level, levelHoldsToM, overvoltages, frequencyHz, ...rest } = system;
  const studied = Object.values(overvoltages).some((figure) => figure !== null);
  return {
    number,
    basis,
    system: {
      ...rest,
      frequencyHz: frequencyHz === null ? null : Number(frequencyHz),
      insulationLevel: level && { ...level, levelHoldsToM },
      overvoltages: studied ? overvoltages : null,
    },
    rules,
    worksheet: worksheetBody(worksheet, system.highestVoltageKv),
    note,
  };
}
