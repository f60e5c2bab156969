import type { SpecificationInput } from '../engine/model';
import { submissionFaults } from './submission';

const WHOLE: SpecificationInput = {
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
  site: { altitudeM: 0, pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: null } },
  string: {
    insulatorCode: 'U160BL',
    arrangement: 'suspension',
    parallelStrings: 1,
    surroundings: 'cross-arm',
    spareUnits: null,
    arcingDevices: 'none',
    arcGapMm: null,
  },
  clearance: {
    method: 'iec-table',
    shapePhaseToEarth: null,
    shapePhaseToPhase: null,
    fastFrontFrom: null,
    enGap: null,
    externalClearanceMm: null,
    safetySource: null,
  },
};

const paths = (input: SpecificationInput) => submissionFaults(input).map(({ path }) => path);

describe('what a specification needs before it is checked', () => {
  it('is nothing more where all is filled in; an altitude of zero is one', () => {
    expect(submissionFaults(WHOLE)).toEqual([]);
  });

  it('names each open input in the words of its field', () => {
    const input = { ...WHOLE, site: { altitudeM: null, pollution: null }, string: null };
    expect(submissionFaults(input)).toContainEqual({
      path: 'site.altitudeM',
      message: 'Altitude: is needed before the specification can be checked',
    });
    expect(paths(input)).toEqual([
      'site.altitudeM',
      'site.pollution.class',
      'site.pollution.type',
      'site.pollution.basis',
      'string.insulatorCode',
      'string.arrangement',
      'string.parallelStrings',
      'string.surroundings',
      'string.arcingDevices',
    ]);
  });

  it('asks for the gap of horns, and for the angles of a V', () => {
    const string = { ...WHOLE.string!, arcingDevices: 'horns', arrangement: 'v-suspension' } as const;
    expect(paths({ ...WHOLE, string })).toEqual([
      'string.vAngleWindwardDeg',
      'string.vAngleLeewardDeg',
      'string.arcGapMm',
    ]);
  });

  it('asks for the switching voltage above 245 kV, and for no string of a bay', () => {
    const system = { ...WHOLE.system!, highestVoltageKv: 420 };
    expect(paths({ ...WHOLE, system })).toEqual(['system.insulationLevel.switchingKv']);
    expect(paths({ ...WHOLE, kind: 'bay', string: null })).toEqual([]);
  });

  it('asks for a level of contamination on the North American basis', () => {
    const site = { altitudeM: 300, pollution: { contamination: null, basis: null, recheckBy: null } };
    const system = { ...WHOLE.system!, insulationLevel: null };
    expect(paths({ ...WHOLE, basis: 'north-american', system, site })).toEqual([
      'site.pollution.contamination',
      'site.pollution.basis',
    ]);
  });
});
