import { METHOD_EDITION } from '../../method-edition';
import type { CompanyInsulationLevel, SpecificationInput, TableConfirmation } from '../../model';
import { ALTITUDE_LIMITS_M, isKnown } from '../../quantities';
import { readSituation } from '../../situation';
import { Calculation } from '../../trace';
import type { WorksheetAnswer, WorksheetInput } from '../../worksheet-model';
import { onePerUnit } from './formulas';
import { proposeLevel } from './proposal';
import type { WorksheetSite } from './requirement';
import { fastFrontRows, slowFrontRows, temporaryRows } from './stresses';

export interface WorksheetOptions {
  trace?: boolean;
  /** Rows that the company adds to the printed table. */
  companyLevels?: readonly CompanyInsulationLevel[];
  confirmations?: readonly TableConfirmation[];
}

/** Voltage and altitude by the limits of every evaluation; the fields are named as the worksheet has them. */
function readLimits(input: WorksheetInput, calculation: Calculation) {
  const { highestVoltageKv, altitudeM } = input;
  const situation = readSituation(
    { system: { highestVoltageKv }, site: { altitudeM } } as SpecificationInput,
    calculation,
  );
  for (const caution of calculation.cautions) caution.field = caution.field?.split('.').at(-1) ?? null;
  return situation;
}

/**
 * The insulation level worksheet, for who does not know the level: representative overvoltages, co-ordination withstand,
 * required withstand, conversion, and the lowest row of the tables that meets them. It is worked out for the larger of
 * the site's altitude and 1000 m, up to which the level then holds. A part left out is reported, and no level is proposed
 * without it; what is proposed is never chosen.
 *
 * Source: IEC 60071-2, from memory, not verified.   Valid: Um 3.6 to 1200 kV, up to 4500 m.
 * Example H.1 (245 kV, 1000 m): 395/950 kV, and 2.35 m between phases at the line entrance.
 */
export function insulationLevelWorksheet(
  input: WorksheetInput,
  { trace = true, companyLevels = [], confirmations = [] }: WorksheetOptions = {},
): WorksheetAnswer {
  const calculation = new Calculation(trace, confirmations);
  const { highestVoltageKv, highestVoltageWhyNot, range, altitudeM, altitudeWhyNot } = readLimits(input, calculation);
  const whyNot = highestVoltageWhyNot ?? altitudeWhyNot;
  const empty = { rows: [], proposedLevel: null, proposedWhyNot: whyNot, lineEntranceClearance: null };
  const answer = (found: Partial<WorksheetAnswer>): WorksheetAnswer => {
    if (calculation.restsOnMemory) {
      const text = 'The worksheet rests on figures from memory, not verified; the calculation names each.';
      calculation.caution('rests-on-memory', 'info', text);
    }
    for (const key of calculation.disputed) {
      const text = `An owner of the print found that it differs from what is used here: ${key}.`;
      calculation.caution('figure-disputed', 'acceptance', text);
    }
    return {
      methodEdition: METHOD_EDITION,
      levelHoldsToM: null,
      onePerUnitKvPeak: null,
      ...empty,
      ...found,
      notAssessed: calculation.notAssessed,
      cautions: calculation.cautions,
      trace: calculation.lines,
    };
  };
  if (highestVoltageKv === null || range === null || altitudeM === null) {
    calculation.missing('worksheet', whyNot ?? 'The highest voltage or the altitude is not known.');
    return answer({});
  }
  const levelHoldsToM = Math.max(altitudeM, ALTITUDE_LIMITS_M.origin);
  const onePerUnitKvPeak = calculation.run(onePerUnit, { highestVoltageKv });
  const { externalInsulation } = input;
  if (!isKnown(externalInsulation)) {
    calculation.missing('worksheet', 'What external requirements are converted for is not chosen.');
    return answer({ levelHoldsToM, onePerUnitKvPeak, proposedWhyNot: 'Not every requirement is assessed.' });
  }
  const site: WorksheetSite = { range, altitudeM: levelHoldsToM, externalInsulation };
  const given = { input, site, highestVoltageKv, onePerUnitKvPeak };
  const rows = [
    ...temporaryRows(given, calculation),
    ...slowFrontRows(given, calculation),
    ...fastFrontRows(given, calculation),
  ];
  const proposal = proposeLevel({ rows, range, highestVoltageKv }, companyLevels, calculation);
  return answer({ levelHoldsToM, onePerUnitKvPeak, rows, ...proposal });
}
