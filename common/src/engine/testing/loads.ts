import type { LoadCaseInput, MechanicalInput } from '../model';

/** Builders of mechanical loads for tests and for known answers: fixed defaults, overrides by name. */
export function aLoadCase(overrides: Partial<LoadCaseInput> = {}): LoadCaseInput {
  return {
    name: 'wind',
    kind: 'wind',
    conductorWeightNPerM: 15,
    windPressurePa: 800,
    conductorDiameterMm: 28,
    conductorTensionN: 30000,
    stringWindN: 300,
    stringWeightN: 700,
    hardwareWeightN: 200,
    ...overrides,
  };
}

export function mechanicalLoads(overrides: Partial<MechanicalInput> = {}): MechanicalInput {
  return {
    basis: 'rd-223',
    subconductors: 1,
    crossing: false,
    acceptedStatistically: false,
    windSpanM: 400,
    weightSpanM: 450,
    lineAngleDeg: 0,
    cases: [aLoadCase()],
    ...overrides,
  };
}
