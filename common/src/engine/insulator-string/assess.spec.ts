import { evaluate } from '../evaluate';
import type { Criterion, CriterionResult, EvaluationContext, SpecificationInput, StringResult } from '../model';
import {
  aCeramicRod,
  aCompositeRod,
  aContext,
  aDisc,
  aLine,
  aNorthAmericanLine,
  aSuspensionUnit,
  companySettings,
  rangeOneLevel,
  rangeTwoLevel,
} from '../testing/specifications';
import { assessString } from './assess';

const answer = (input: SpecificationInput, context: EvaluationContext = aContext()) => {
  const evaluation = evaluate(input, context);
  if (evaluation.string === null) throw new Error('no string');
  return { ...evaluation, string: evaluation.string };
};
const criterion = ({ criteria }: StringResult, name: Criterion): CriterionResult =>
  criteria.find((one) => one.criterion === name)!;
const codes = (input: SpecificationInput, context?: EvaluationContext): string[] =>
  answer(input, context).cautions.map(({ code, severity }) => `${severity} ${code}`);

const KV220 = { nominalVoltageKv: 220, highestVoltageKv: 245, insulationLevel: rangeOneLevel(460, 1050) };
const KV400 = { nominalVoltageKv: 400, highestVoltageKv: 420, insulationLevel: rangeTwoLevel(1050, 1.5, 1425) };

describe(assessString.name, () => {
  // Common practice, no published source, except 66 kV five discs and 132 kV ten discs of an examination question bank.
  it.each([
    [66, 72.5, rangeOneLevel(140, 325), 5],
    [132, 145, rangeOneLevel(275, 650), 9],
    [220, 245, rangeOneLevel(460, 1050), 14],
  ])(
    'counts an ordinary clean %d kV string as it stands in service',
    (nominalVoltageKv, highestVoltageKv, insulationLevel, units) => {
      const { string } = answer(aLine({ system: { nominalVoltageKv, highestVoltageKv, insulationLevel } }));
      expect(string.units).toBe(units);
    },
  );

  it('takes the largest count and names ties in order', () => {
    const { string } = answer(aLine({ system: KV220 }));
    expect(string.criteria.map(({ requiredUnits }) => requiredUnits)).toEqual([14, 14, null, 13, null]);
    expect([string.governedBy, string.tiedWith]).toEqual(['pollution', ['lightning']]);
  });

  it('counts creepage on the phase-to-earth voltage where faults are cleared, in both conventions', () => {
    const { string } = answer(aLine({ system: KV220 }));
    expect(string.creepageRequiredMm).toBeCloseTo((27.8 * 245) / Math.sqrt(3), 9);
    expect(string.creepageVoltageBasis).toBe('phase-to-earth');
    expect(string.uscdRequiredMmPerKv).toBeCloseTo(27.8, 9);
    expect(string.scd1986RequiredMmPerKvUm).toBeCloseTo(16.05, 2);
    expect(string.uscdProvidedMmPerKv! / string.scd1986ProvidedMmPerKvUm!).toBeCloseTo(Math.sqrt(3), 9);
  });

  it('counts creepage on the line-to-line voltage where a fault may stand, with the other count beside it', () => {
    const input = aLine({ system: { neutralEarthing: 'isolated', earthFault: 'sustained' } });
    const { string, cautions } = answer(input);
    expect(string.creepageRequiredMm).toBeCloseTo(27.8 * 145, 9);
    expect(string.creepageVoltageBasis).toBe('line-to-line');
    expect(criterion(string, 'pollution').requiredUnits).toBe(14);
    expect(cautions.find(({ code }) => code === 'creepage-on-line-voltage')?.text).toContain('8 units');
  });

  it('corrects creepage above the company origin: 0.5, and 0.8 for fog profiles', () => {
    const creepageAt = (altitudeM: number, profile: 'standard' | 'fog'): number =>
      answer(aLine({ site: { altitudeM } }), aContext({ insulator: aDisc({ profile }) })).string.creepageRequiredMm!;
    expect(creepageAt(1000, 'standard')).toBeCloseTo((27.8 * 145) / Math.sqrt(3), 9);
    expect(creepageAt(2310, 'standard') / creepageAt(1000, 'standard')).toBeCloseTo(Math.exp((0.5 * 1310) / 8150), 12);
    expect(creepageAt(2310, 'fog') / creepageAt(1000, 'fog')).toBeCloseTo(Math.exp((0.8 * 1310) / 8150), 12);
  });

  it('tests a 1050 kV string for 2310 m with 1233 kV', () => {
    const { string } = answer(aLine({ system: KV220, site: { altitudeM: 2310 } }));
    expect(Math.round(string.testLevels.lightningDryKvPeak!)).toBe(1233);
  });

  it('counts switching in range II and leaves power frequency out', () => {
    const { string, cautions } = answer(aLine({ system: KV400 }));
    const kins = 1.45 * (0.85 + 0.15 * Math.exp(1 - 1.45));
    const d = (Math.exp(1050 / (1 - 1.3 * 0.06) / (1080 * kins)) - 1) / 0.46;
    expect(criterion(string, 'switching')).toMatchObject({
      state: 'assessed',
      requiredUnits: Math.ceil((d * 1000) / 146),
    });
    expect(criterion(string, 'switching').requiredValue).toBeCloseTo(d * 1000, 6);
    expect(criterion(string, 'power-frequency').state).toBe('not-applicable');
    expect(cautions.map(({ code }) => code)).toContain('switching-wet-by-test');
  });

  it('uses what a unit has beyond its spacing', () => {
    const { string } = answer(aLine(), aContext({ insulator: aDisc({ dryArcMm: 186 }) }));
    expect(criterion(string, 'lightning').requiredUnits).toBe(Math.ceil((1207.819 - 40) / 146));
    expect(string.dryArcMm).toBe(string.units! * 146 + 40);
  });

  it('adds the company units to tension strings and those added by hand, as a line of their own', () => {
    const { string } = answer(aLine({ string: { arrangement: 'tension', spareUnits: 2 } }));
    expect([string.unitsBeforeExtra, string.extraUnits, string.units]).toEqual([9, 3, 12]);
    expect(string.sectionLengthMm).toBe(12 * 146);
    expect(criterion(string, 'lightning').marginUnits).toBe(3);
  });

  it('says that extra units were not filled in, and counts none', () => {
    const { string, cautions } = answer(aLine({ string: { spareUnits: null } }));
    expect(string.extraUnits).toBe(0);
    expect(cautions).toContainEqual(
      expect.objectContaining({ code: 'extra-units-not-filled-in', severity: 'caution', field: 'string.spareUnits' }),
    );
  });

  it('takes the wet flashover from the table for 255 x 146 mm and from the catalogue elsewhere', () => {
    const other = aDisc({ diameterMm: 280 });
    expect(criterion(answer(aLine(), aContext({ insulator: other })).string, 'power-frequency').state).toBe(
      'not-assessed',
    );
    expect(codes(aLine(), aContext({ insulator: other }))).toContain('caution power-frequency-not-assessed');
    const known = aDisc({
      diameterMm: 280,
      wetFlashover: [
        { units: 8, wetKvRms: 300 },
        { units: 9, wetKvRms: 320 },
      ],
    });
    expect(criterion(answer(aLine(), aContext({ insulator: known })).string, 'power-frequency').requiredUnits).toBe(9);
  });

  it('raises acceptance where a criterion applies without a figure and no test level stands for it', () => {
    const input = aLine({ site: { pollution: { class: null, type: null, basis: null, recheckBy: null } } });
    const { string } = answer(input);
    expect(string.units).toBe(9);
    expect(criterion(string, 'pollution')).toMatchObject({
      state: 'not-assessed',
      requiredUnits: null,
      verdict: 'unknown',
    });
    expect(codes(input)).toContain('acceptance pollution-not-assessed');
  });

  it('names the input that a criterion misses', () => {
    const { cautions } = answer(aLine({ string: { surroundings: null } }));
    expect(cautions).toContainEqual(
      expect.objectContaining({ code: 'lightning-not-assessed', severity: 'caution', field: 'string.surroundings' }),
    );
  });

  it('checks a rod against every requirement: an ordinary 245 kV rod at 2310 m comes out short', () => {
    const context = aContext({ insulator: aCompositeRod() });
    const atSea = answer(aLine({ system: KV220 }), context);
    expect(criterion(atSea.string, 'lightning').verdict).toBe('met');
    expect([atSea.string.units, atSea.string.extraUnits, atSea.string.governedBy]).toEqual([1, 0, 'lightning']);
    const high = aLine({ system: KV220, site: { altitudeM: 2310 } });
    const lightning = criterion(answer(high, context).string, 'lightning');
    expect(lightning).toMatchObject({ requiredUnits: null, marginUnits: null, providedValue: 2000, verdict: 'short' });
    expect(lightning.marginPercent).toBeCloseTo((2000 / 2291.4 - 1) * 100, 1);
    expect(codes(high, context)).toContain('fail lightning-short');
  });

  it('counts ceramic rods in series, and asks for their average diameter', () => {
    const two = aLine({ system: KV220, string: { rodsInSeries: 2 } });
    const { string } = answer(two, aContext({ insulator: aCeramicRod() }));
    expect([string.units, string.dryArcMm, string.creepageProvidedMm]).toEqual([2, 2100, 7800]);
    const unknown = answer(two, aContext({ insulator: aCeramicRod({ averageDiameterMm: null }) })).string;
    expect(criterion(unknown, 'pollution').state).toBe('not-assessed');
    const thick = answer(two, aContext({ insulator: aCeramicRod({ averageDiameterMm: 400 }) })).string;
    expect(thick.creepageRequiredMm! / string.creepageRequiredMm!).toBeCloseTo(1.05, 9);
  });

  describe('arcing devices', () => {
    const horns = (arcGapMm: number | null) => aLine({ system: KV220, string: { arcingDevices: 'horns', arcGapMm } });

    it('let the gap decide lightning, which more units do not cure', () => {
      expect(criterion(answer(horns(1960)).string, 'lightning').verdict).toBe('met');
      const short = answer(horns(1950));
      expect(criterion(short.string, 'lightning').verdict).toBe('short');
      expect(short.string.units).toBe(14);
      expect(codes(horns(1950))).toContain('fail arc-gap-short');
      expect(short.string.dryArcWithDevicesMm).toBe(1950);
    });

    it('ask for acceptance where rings have no gap', () => {
      expect(codes(aLine({ string: { arcingDevices: 'rings', arcGapMm: null } }))).toContain(
        'acceptance rings-without-gap',
      );
    });

    it('without the gap of their horns leave the verdict open', () => {
      expect(criterion(answer(horns(null)).string, 'lightning').verdict).toBe('unknown');
    });

    it('that are not known leave the verdict open', () => {
      const { string } = answer(aLine({ string: { arcingDevices: null } }));
      expect(criterion(string, 'lightning')).toMatchObject({
        requiredUnits: 9,
        providedValue: null,
        verdict: 'unknown',
      });
    });
  });

  describe('minimum', () => {
    it('is the company minimum of the nominal voltage', () => {
      const settings = companySettings({ companyMinimumUnits: [{ nominalVoltageKv: 132, units: 11 }] });
      const { string } = answer(aLine(), aContext({ settings }));
      expect([string.units, string.governedBy]).toEqual([11, 'minimum']);
    });

    it('is the suspension level of the next higher nominal voltage on the North American basis', () => {
      const unit = aContext({ insulator: aSuspensionUnit() });
      expect(criterion(answer(aNorthAmericanLine(), unit).string, 'minimum').requiredUnits).toBe(8);
      const high = aNorthAmericanLine();
      high.site!.altitudeM = 2310;
      expect(criterion(answer(high, unit).string, 'minimum').requiredUnits).toBe(Math.ceil(8 / 0.86));
    });

    it('asks the same section length and creepage of other units', () => {
      const other = aContext({ insulator: aSuspensionUnit({ spacingMm: 170, creepageMm: 370 }) });
      expect(criterion(answer(aNorthAmericanLine(), other).string, 'minimum').requiredUnits).toBe(7);
    });
  });

  it('takes leakage by contamination level on the North American basis', () => {
    const { string } = answer(aNorthAmericanLine(), aContext({ insulator: aSuspensionUnit() }));
    expect(string.leakageInPerKvLineToGround).toBeCloseTo(1.25, 9);
    expect(string.creepageRequiredMm).toBeCloseTo((1.25 * 25.4 * 145) / Math.sqrt(3), 9);
  });

  it('never takes a contamination level on the IEC basis', () => {
    const input = aLine({ site: { pollution: { contamination: 'light', basis: 'measured', recheckBy: null } } });
    expect(criterion(answer(input).string, 'pollution').state).toBe('not-assessed');
  });

  it('names the external clearance that the string asks for', () => {
    const provided = (externalClearanceMm: number) =>
      answer(
        aLine({
          system: KV220,
          clearance: {
            method: 'iec-table',
            shapePhaseToEarth: 'conductor-structure',
            shapePhaseToPhase: null,
            fastFrontFrom: null,
            enGap: null,
            externalClearanceMm,
            safetySource: null,
          },
        }),
      );
    expect(provided(2250).string.coordination).toMatchObject({ requiredExternalMm: 2250, verdict: 'met' });
    expect(provided(2240).string.coordination.verdict).toBe('short');
    expect(provided(2240).cautions.map(({ code }) => code)).toContain('external-clearance-short');
  });

  it('gives the length limits of a string of discs with its fittings', () => {
    const { string } = answer(aLine({ string: { hardwareLengthMm: 400 } }));
    expect(string.stringLengthWithFittingsMinMm).toBeCloseTo(9 * (146 - 4.68) + 400, 9);
    expect(string.stringLengthWithFittingsMaxMm).toBeCloseTo(9 * (146 + 4.68) + 400, 9);
  });

  it('has no figure beyond the gap laws', () => {
    const system = {
      ...KV400,
      highestVoltageKv: 1200,
      nominalVoltageKv: 1150,
      insulationLevel: rangeTwoLevel(1950, 1.6, 2700),
    };
    const input = aLine({ system, site: { altitudeM: 4500 }, string: { surroundings: 'open' } });
    const { string } = answer(input);
    expect(codes(input)).toContain('stop switching-beyond-gap-law');
    expect([string.units, string.sectionLengthMm, criterion(string, 'switching').requiredUnits]).toEqual([
      null,
      null,
      null,
    ]);
  });
});
