import { evaluate } from './evaluate';
import { inputFaults } from './input-faults';
import type { EvaluationContext, SpecificationInput } from './model';
import {
  aCompositeRod,
  aContext,
  aLine,
  aNorthAmericanLine,
  companySettings,
  rangeOneLevel,
  rangeTwoLevel,
} from './testing/specifications';

const paths = (input: SpecificationInput, context: EvaluationContext = aContext()): string[] =>
  inputFaults(input, context).map(({ path }) => path);

describe(inputFaults.name, () => {
  it('finds none in an ordinary line, nor in an empty draft', () => {
    expect(paths(aLine())).toEqual([]);
    expect(paths(aNorthAmericanLine())).toEqual([]);
    expect(paths({} as SpecificationInput, aContext({ insulator: null }))).toEqual([]);
  });

  it('refuses a level that is no row of its voltage', () => {
    expect(paths(aLine({ system: { insulationLevel: rangeOneLevel(275, 550) } }))).toEqual(['system.insulationLevel']);
    expect(paths(aLine({ system: { insulationLevel: rangeOneLevel(460, 1050) } }))).toEqual(['system.insulationLevel']);
    expect(paths(aLine({ system: { highestVoltageKv: 140 } }))).toEqual(['system.insulationLevel']);
  });

  it('takes a row that the company has added', () => {
    const insulationLevels = [
      {
        highestVoltageKv: 145,
        powerFrequencyKv: 325,
        switchingKv: null,
        switchingPhaseRatio: null,
        lightningKv: 750,
        reason: 'salt',
      },
    ];
    const input = aLine({ system: { insulationLevel: rangeOneLevel(325, 750) } });
    expect(paths(input)).toEqual(['system.insulationLevel']);
    expect(paths(input, aContext({ settings: companySettings({ insulationLevels }) }))).toEqual([]);
  });

  it('asks for the switching level in range II and refuses it in range I', () => {
    const system = { nominalVoltageKv: 400, highestVoltageKv: 420 };
    const without = { ...rangeTwoLevel(1050, 1.5, 1425), switchingKv: null, switchingPhaseRatio: null };
    expect(paths(aLine({ system: { ...system, insulationLevel: without } }))).toEqual([
      'system.insulationLevel.switchingKv',
    ]);
    expect(paths(aLine({ system: { ...system, insulationLevel: rangeTwoLevel(1050, 1.5, 1425) } }))).toEqual([]);
    const switchingKv = rangeOneLevel(275, 650, { switchingKv: 550 });
    expect(paths(aLine({ system: { insulationLevel: switchingKv } }))).toEqual(['system.insulationLevel.switchingKv']);
  });

  it('takes a row of range II also where its ratio between phases is left out', () => {
    const system = { nominalVoltageKv: 400, highestVoltageKv: 420 };
    const level = rangeTwoLevel(1050, 1.5, 1425);
    const input = aLine({ system: { ...system, insulationLevel: { ...level, switchingPhaseRatio: null } } });
    expect(paths(input)).toEqual([]);
    const whole = evaluate(aLine({ system: { ...system, insulationLevel: level } }), aContext());
    expect(evaluate(input, aContext())).toEqual(whole);
  });

  it('leaves a voltage outside the method to the stop of the evaluation', () => {
    expect(paths(aLine({ system: { highestVoltageKv: 2000 } }))).toEqual([]);
  });

  it('leaves a level that is not complete yet to the draft', () => {
    expect(paths(aLine({ system: { insulationLevel: rangeOneLevel(null, 650) } }))).toEqual([]);
  });

  it('takes a BIL of the voltage on the North American basis', () => {
    const input = aNorthAmericanLine();
    input.system!.insulationLevel = rangeOneLevel(null, 1050);
    expect(paths(input)).toEqual(['system.insulationLevel']);
  });

  it('refuses an effective neutral with a fault that stands, and a highest voltage below the nominal', () => {
    expect(paths(aLine({ system: { earthFault: 'sustained' } }))).toEqual(['system.earthFault']);
    expect(paths(aLine({ system: { nominalVoltageKv: 150 } }))).toEqual(['system.highestVoltageKv']);
  });

  it('refuses a code that the catalogue does not have', () => {
    expect(paths(aLine(), aContext({ insulator: null }))).toEqual(['string.insulatorCode']);
    expect(paths(aLine({ string: { insulatorCode: null } }), aContext({ insulator: null }))).toEqual([]);
  });

  it('refuses extra units for a rod and horns without a gap', () => {
    expect(paths(aLine({ string: { spareUnits: 1 } }), aContext({ insulator: aCompositeRod() }))).toEqual([
      'string.spareUnits',
    ]);
    expect(paths(aLine({ string: { arcingDevices: 'horns', arcGapMm: null } }))).toEqual(['string.arcGapMm']);
  });

  it('refuses a V without the angle of a leg', () => {
    const v = { arrangement: 'v-suspension', vAngleWindwardDeg: 45 } as const;
    expect(paths(aLine({ string: v }))).toEqual(['string.vAngleLeewardDeg']);
    expect(paths(aLine({ string: { ...v, vAngleLeewardDeg: 40 } }))).toEqual([]);
  });
});
