import type { SpecificationInput } from '@bellgap/common/api';

/** An ordinary 220 kV suspension string; `step` varies what an engineer varies, so that nothing is answered from a memory. */
export function sampleInput(step = 0): SpecificationInput {
  return {
    kind: 'line',
    basis: 'iec',
    system: {
      nominalVoltageKv: 220,
      highestVoltageKv: 245,
      frequencyHz: 50,
      neutralEarthing: 'effective',
      earthFault: 'cleared',
      insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
    },
    site: {
      altitudeM: 500 + (step % 1500),
      pollution: {
        class: (['b', 'c', 'd', 'e'] as const)[step % 4] ?? 'b',
        type: 'A',
        basis: 'measured',
        recheckBy: null,
      },
    },
    string: {
      insulatorCode: 'U160BL',
      arrangement: 'suspension',
      parallelStrings: 1,
      surroundings: 'cross-arm',
      spareUnits: 0,
      arcingDevices: 'none',
      arcGapMm: null,
    },
    clearance: {
      method: 'iec-table',
      shapePhaseToEarth: 'conductor-structure',
      shapePhaseToPhase: 'conductor-conductor',
      fastFrontFrom: null,
      enGap: null,
      externalClearanceMm: null,
      safetySource: null,
    },
  };
}
