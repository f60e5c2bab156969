import type { AnswerOf, contract } from '@bellgap/common/api';

type Settings = AnswerOf<typeof contract.companySettings>['settings'];
/** A figure as the form holds it: read, empty, or text that could not be read. */
type Typed = number | string | null;

/** What the form of the company settings holds: every figure may be empty or unread while it is typed. */
export interface SettingsValues {
  settings: {
    tensionExtraUnits: Typed;
    creepageAltitudeOriginM: Typed;
    altitudeStepM: Typed;
    spareSharePercent: Typed;
    maximumStringKinds: Typed;
    companyMinimumUnits: { nominalVoltageKv: Typed; units: Typed }[];
    ruleCards: {
      id: string;
      text: string;
      kvPerUnit: Typed;
      altitudeOriginM: Typed;
      metresPerExtraUnit: Typed;
      dirtyClasses: string[];
      dirtyExtraUnits: Typed;
      bandUnits: Typed;
      minimumVoltageKv: Typed;
      maximumVoltageKv: Typed;
    }[];
    insulationLevels: {
      highestVoltageKv: Typed;
      powerFrequencyKv: Typed;
      switchingKv: Typed;
      switchingPhaseRatio: Typed;
      lightningKv: Typed;
      reason: string;
    }[];
  };
  reason: string;
}

export type Listed = 'companyMinimumUnits' | 'ruleCards' | 'insulationLevels';

export function settingsValues(settings: Settings): SettingsValues {
  return { settings: structuredClone(settings) as SettingsValues['settings'], reason: '' };
}

export const NEW_ITEMS: { [L in Listed]: SettingsValues['settings'][L][number] } = {
  companyMinimumUnits: { nominalVoltageKv: null, units: null },
  ruleCards: {
    id: '',
    text: '',
    kvPerUnit: null,
    altitudeOriginM: null,
    metresPerExtraUnit: null,
    dirtyClasses: [],
    dirtyExtraUnits: null,
    bandUnits: null,
    minimumVoltageKv: null,
    maximumVoltageKv: null,
  },
  insulationLevels: {
    highestVoltageKv: null,
    powerFrequencyKv: null,
    switchingKv: null,
    switchingPhaseRatio: null,
    lightningKv: null,
    reason: '',
  },
};
