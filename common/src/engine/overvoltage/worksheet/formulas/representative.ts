import { cite, DEFINITION } from '../../../sources';
import { formula } from '../../../trace';
import { guide } from './guide';

/** One per unit. Example: 245 kV give 200 kV. Source: IEC 60071-1, definition. */
export const onePerUnit = formula({
  id: 'worksheet.one-per-unit',
  heading: 'One per unit: peak of the highest voltage to earth',
  source: cite(DEFINITION, 'peak to earth', 'derived'),
  expression: 'U1 = Um * sqrt(2) / sqrt(3)',
  symbols: { Um: 'highestVoltageKv' },
  result: 'onePerUnitKvPeak',
  compute: ({ highestVoltageKv }: { highestVoltageKv: number }) => (highestVoltageKv * Math.SQRT2) / Math.sqrt(3),
});

// ---- representative overvoltages -----------------------------------------------------------------------------------

/** Temporary overvoltage to earth during an earth fault. Example H.1: factor 1.5 at 245 kV gives 212 kV. */
export const temporaryToEarth = formula({
  id: 'worksheet.temporary-to-earth',
  heading: 'Temporary overvoltage to earth',
  source: guide('temporary overvoltages, earth fault'),
  expression: 'Urp = k * Um / sqrt(3)',
  symbols: { k: 'earthFaultFactor', Um: 'highestVoltageKv' },
  result: 'representativeKvRms',
  compute: ({ earthFaultFactor: k, highestVoltageKv: Um }: { earthFaultFactor: number; highestVoltageKv: number }) =>
    (k * Um) / Math.sqrt(3),
});

/** Temporary overvoltage between phases after load rejection. Example H.1: factor 1.4 at 245 kV gives 343 kV. */
export const temporaryBetweenPhases = formula({
  id: 'worksheet.temporary-between-phases',
  heading: 'Temporary overvoltage between phases',
  source: guide('temporary overvoltages, load rejection'),
  expression: 'Urp = h * Um',
  symbols: { h: 'loadRejectionFactor', Um: 'highestVoltageKv' },
  result: 'representativeKvRms',
  compute: ({
    loadRejectionFactor: h,
    highestVoltageKv: Um,
  }: {
    loadRejectionFactor: number;
    highestVoltageKv: number;
  }) => h * Um,
});

/** Largest slow-front overvoltage to earth, phase-peak method. Example H.1: 3.0 p.u. give 700 kV. */
export const truncationToEarth = formula({
  id: 'worksheet.truncation-to-earth',
  heading: 'Truncation value of the slow-front overvoltage to earth',
  source: guide('slow-front overvoltages, phase-peak method'),
  expression: 'Uet = (1.25 * Ue2 - 0.25) * U1',
  symbols: { Ue2: 'slowFrontPu', U1: 'onePerUnitKvPeak' },
  result: 'truncationKvPeak',
  compute: ({ slowFrontPu: Ue2, onePerUnitKvPeak: U1 }: { slowFrontPu: number; onePerUnitKvPeak: number }) =>
    (1.25 * Ue2 - 0.25) * U1,
});

/** Largest slow-front overvoltage between phases, phase-peak method. Example H.1: 4.5 p.u. give 1039 kV. */
export const truncationBetweenPhases = formula({
  id: 'worksheet.truncation-between-phases',
  heading: 'Truncation value of the slow-front overvoltage between phases',
  source: guide('slow-front overvoltages, phase-peak method'),
  expression: 'Upt = (1.25 * Up2 - 0.43) * U1',
  symbols: { Up2: 'slowFrontPu', U1: 'onePerUnitKvPeak' },
  result: 'truncationKvPeak',
  compute: ({ slowFrontPu: Up2, onePerUnitKvPeak: U1 }: { slowFrontPu: number; onePerUnitKvPeak: number }) =>
    (1.25 * Up2 - 0.43) * U1,
});

/** With arresters: not above their protection level; `phases` 1 to earth, 2 between phases. Example H.1: 410, 820 kV. */
export const limitedByArrester = formula({
  id: 'worksheet.limited-by-arrester',
  heading: 'Representative slow-front overvoltage, limited by the arresters',
  source: guide('slow-front overvoltages, surge arresters'),
  expression: 'Urp = min(Ut, p * Ups)',
  symbols: { Ut: 'truncationKvPeak', p: 'phasesCount', Ups: 'protectionKvPeak' },
  result: 'representativeKvPeak',
  compute: ({
    truncationKvPeak,
    phasesCount,
    protectionKvPeak,
  }: {
    truncationKvPeak: number;
    phasesCount: number;
    protectionKvPeak: number;
  }) => Math.min(truncationKvPeak, phasesCount * protectionKvPeak),
});
