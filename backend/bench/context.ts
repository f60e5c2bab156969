import type { EvaluationContext } from '@bellgap/common/api';
import { standardUnits } from '../src/catalogue/standard-units';
import { sampleInput } from './sample';

/** What the engine is given besides the sample: its unit, and settings as they are before a company changes them. */
export function sampleContext(): EvaluationContext {
  const code = sampleInput().string?.insulatorCode;
  const insulator = standardUnits().find((unit) => unit.code === code);
  if (!insulator) throw new Error(`The catalogue has no unit ${code}`);
  return {
    insulator,
    settings: {
      version: 1,
      tensionExtraUnits: 1,
      creepageAltitudeOriginM: 1000,
      altitudeStepM: 100,
      companyMinimumUnits: [],
      spareSharePercent: 3,
      maximumStringKinds: 6,
      ruleCards: [],
      insulationLevels: [],
    },
    confirmations: [],
  };
}
