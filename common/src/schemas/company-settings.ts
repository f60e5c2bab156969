import * as yup from 'yup';
import { POLLUTION_CLASSES } from '../engine/model';
import { requiredText } from './parts';

const count = (label: string, atMost: number) =>
  yup
    .number()
    .typeError(`${label}: a number is needed`)
    .integer(`${label}: a whole number is needed`)
    .min(0, `${label}: not below 0`)
    .max(atMost, `${label}: at most ${atMost}`)
    .required(`${label}: is needed`);
const figure = (label: string, atLeast: number, atMost: number) =>
  yup
    .number()
    .typeError(`${label}: a number is needed`)
    .min(atLeast, `${label}: at least ${atLeast}`)
    .max(atMost, `${label}: at most ${atMost}`)
    .required(`${label}: is needed`);
const optionalFigure = (label: string) =>
  yup
    .number()
    .typeError(`${label}: a number is needed`)
    .moreThan(0, `${label}: must be more than 0`)
    .nullable()
    .defined();

export const companySettingsSchema = yup
  .object({
    tensionExtraUnits: count('Extra units in tension strings', 5),
    creepageAltitudeOriginM: figure('Altitude from which creepage is corrected', 0, 2000),
    altitudeStepM: figure('Step by which altitudes are rounded up', 1, 500),
    companyMinimumUnits: yup
      .array()
      .of(yup.object({ nominalVoltageKv: figure('Nominal voltage', 1, 1200), units: count('Units', 60) }).noUnknown())
      .max(40)
      .required(),
    spareSharePercent: figure('Store spares', 0, 100),
    maximumStringKinds: count('Kinds of string', 50),
    ruleCards: yup
      .array()
      .of(
        yup
          .object({
            id: requiredText('Card', 20),
            text: requiredText('Text', 300),
            kvPerUnit: figure('kV per unit', 1, 100),
            altitudeOriginM: figure('Altitude origin', 0, 4500),
            metresPerExtraUnit: optionalFigure('Metres per extra unit'),
            dirtyClasses: yup
              .array()
              .of(
                yup
                  .string()
                  .oneOf([...POLLUTION_CLASSES])
                  .required(),
              )
              .required(),
            dirtyExtraUnits: count('Extra units where dirty', 10),
            bandUnits: count('Band', 10),
            minimumVoltageKv: figure('From', 1, 1200),
            maximumVoltageKv: figure('To', 1, 1200),
          })
          .noUnknown(),
      )
      .max(20)
      .required(),
    insulationLevels: yup
      .array()
      .of(
        yup
          .object({
            highestVoltageKv: figure('Highest voltage', 3.6, 1200),
            powerFrequencyKv: optionalFigure('Power-frequency withstand'),
            switchingKv: optionalFigure('Switching withstand'),
            switchingPhaseRatio: optionalFigure('Ratio'),
            lightningKv: figure('Lightning withstand', 1, 3000),
            reason: requiredText('Reason', 500),
          })
          .noUnknown(),
      )
      .max(40)
      .required(),
  })
  .noUnknown();

export const saveCompanySettingsSchema = yup
  .object({ settings: companySettingsSchema.required(), reason: requiredText('Reason', 500) })
  .noUnknown();
