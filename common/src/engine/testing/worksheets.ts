import type { WorksheetInput } from '../worksheet-model';

/**
 * The example of IEC 60071-2, annex H.1: 245 kV, 1000 m, heavy pollution (from memory, not verified). The altitude
 * exponent and one co-ordination factor are those that the example reads off the standard's curves.
 */
export function aWorksheet(overrides: Partial<WorksheetInput> = {}): WorksheetInput {
  return {
    highestVoltageKv: 245,
    altitudeM: 1000,
    earthFaultFactor: 1.5,
    loadRejectionFactor: 1.4,
    powerFrequencySurface: 'polluted-standard',
    externalInsulation: 'air-or-dry',
    switchingPhaseToEarthExponent: 0.94,
    arrester: { switchingProtectionKvPeak: 410, lightningProtectionKvPeak: 500 },
    places: [
      { place: 'line-entrance', slowFrontPhaseToEarthPu: 3, slowFrontPhaseToPhasePu: 4.5 },
      {
        place: 'other-equipment',
        slowFrontPhaseToEarthPu: 1.9,
        slowFrontPhaseToPhasePu: 2.9,
        phaseToEarthCoordinationFactor: 1.03,
      },
    ],
    fastFront: {
      subconductorsCount: 1,
      linesConnectedCount: 2,
      spanM: 300,
      lineOutageRatePerKmYear: 0.01,
      acceptedFailureRatePerYear: 0.0025,
      arresterToInternalM: 30,
      arresterToExternalM: 60,
    },
    ...overrides,
  };
}
