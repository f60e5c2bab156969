import fc from 'fast-check';
import { evaluate } from '../evaluate';
import {
  ARRANGEMENTS,
  BRIDGE_CAUSES,
  CONTAMINATION_LEVELS,
  POLLUTION_CLASSES,
  SURROUNDINGS,
  type EvaluationContext,
  type InsulationLevelInput,
  type SpecificationInput,
} from '../model';
import { insulationLevelsFor } from '../overvoltage';
import { aCompositeRod, aContext, aDisc, aLine, companySettings, rangeOneLevel } from '../testing/specifications';
import { bridge } from './bridge';

const ruleOf = (input: SpecificationInput, context: EvaluationContext = aContext()) => {
  const { ruleOfThumb, string } = evaluate(input, context, { trace: false });
  const estimate = ruleOfThumb.rows.find(({ id }) => id === 'discs-by-15-kv')?.estimate ?? null;
  return { ...ruleOfThumb, estimate, units: string?.units ?? null };
};
const levelOf = (row: InsulationLevelInput): InsulationLevelInput => ({
  lightningKv: row.lightningKv,
  switchingKv: row.switchingKv,
  powerFrequencyKv: row.powerFrequencyKv,
  switchingPhaseRatio: row.switchingPhaseRatio,
});

const KV220 = { nominalVoltageKv: 220, highestVoltageKv: 245, insulationLevel: rangeOneLevel(460, 1050) };

describe(bridge.name, () => {
  it('leads from the count of the rule to the specified one', () => {
    const input = aLine({
      system: { ...KV220, neutralEarthing: 'effective' },
      site: { altitudeM: 2310, pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: null } },
      string: { arrangement: 'tension', spareUnits: 0 },
    });
    const insulator = aDisc({ spacingMm: 170, diameterMm: 280, creepageMm: 380 });
    const settings = companySettings({ companyMinimumUnits: [{ nominalVoltageKv: 220, units: 19 }] });
    const { bridge: steps, bridgeWhyNot, estimate, units } = ruleOf(input, aContext({ insulator, settings }));
    expect(bridgeWhyNot).toBeNull();
    expect(estimate).toBe(15);
    // By hand: 14 (class b), 21 (class d), 23 (2310 m), 18 of 380 mm, minimum 19, one for tension.
    expect(steps).toEqual([
      { cause: 'rule-to-method', units: -1 },
      { cause: 'pollution', units: 7 },
      { cause: 'earth-fault', units: 0 },
      { cause: 'altitude', units: 2 },
      { cause: 'insulation-level', units: 0 },
      { cause: 'surroundings', units: 0 },
      { cause: 'arcing-devices', units: 0 },
      { cause: 'unit', units: -5 },
      { cause: 'minimum', units: 1 },
      { cause: 'extra-units', units: 1 },
    ]);
    expect(units).toBe(20);
  });

  it('is not there for rods, outside the rule, without a count or a criterion, and says why', () => {
    const why = (input: SpecificationInput, context?: EvaluationContext): string | null => {
      const { bridge: steps, bridgeWhyNot } = ruleOf(input, context);
      expect(steps).toBeNull();
      return bridgeWhyNot;
    };
    expect(why(aLine(), aContext({ insulator: aCompositeRod() }))).toContain('made of rods');
    expect(why(aLine({ system: { nominalVoltageKv: 400, highestVoltageKv: 420, insulationLevel: null } }))).toContain(
      'from 33 to 230 kV',
    );
    expect(why(aLine({ string: null }))).toBe('The sheet has no figure yet to compare.');
    expect(why(aLine(), aContext({ insulator: null }))).toBe('The sheet has no figure yet to compare.');
    const unknown = { class: null, type: null, basis: null, recheckBy: null };
    expect(why(aLine({ site: { pollution: unknown } }))).toContain('The count lacks pollution.');
    expect(why(aLine({ string: { surroundings: null } }))).toContain('The count lacks lightning.');
    expect(why(aLine({ site: { altitudeM: 6000 } }))).toContain('outside the method');
    expect(why(aLine({ string: { arrangement: null } }))).toBe('The sheet has no figure yet to compare.');
  });

  const VOLTAGES = [
    [33, 36],
    [66, 72.5],
    [110, 123],
    [132, 145],
    [150, 170],
    [220, 245],
  ] as const;
  const aCase = fc.constantFrom(...VOLTAGES).chain(([nominalVoltageKv, highestVoltageKv]) =>
    fc.record({
      nominalVoltageKv: fc.constant(nominalVoltageKv),
      highestVoltageKv: fc.constant(highestVoltageKv),
      level: fc.constantFrom(...insulationLevelsFor(highestVoltageKv, 'iec')),
      holdsToM: fc.constantFrom(1000, 2500),
      altitudeM: fc.integer({ min: -200, max: 4500 }),
      pollutionClass: fc.constantFrom(...POLLUTION_CLASSES),
      earthFault: fc.constantFrom('cleared' as const, 'sustained' as const),
      surroundings: fc.constantFrom(...SURROUNDINGS),
      arrangement: fc.constantFrom(...ARRANGEMENTS),
      spareUnits: fc.integer({ min: 0, max: 3 }),
      devices: fc.constantFrom('none' as const, 'horns' as const),
      companyMinimum: fc.constantFrom(null, 4, 18),
      originM: fc.constantFrom(0, 1000),
      unit: fc.constantFrom(
        aDisc(),
        aDisc({ spacingMm: 170, diameterMm: 330, creepageMm: 525, profile: 'fog' }),
        aDisc({ spacingMm: 146, creepageMm: 440, diameterMm: 280, dryArcMm: 200 }),
      ),
    }),
  );
  type Case = typeof aCase extends fc.Arbitrary<infer T> ? T : never;

  /** The same steps by whole evaluations, each with one more input set to its real value. */
  function byWholeEvaluations(one: Case): (number | null)[] {
    const highest = [...insulationLevelsFor(one.highestVoltageKv, 'iec')].sort(
      (row, other) => other.lightningKv - row.lightningKv,
    )[0]!;
    const countOf = (upTo: number): number | null => {
      const at = BRIDGE_CAUSES.slice(0, upTo + 1);
      const is = (cause: (typeof BRIDGE_CAUSES)[number]): boolean => at.includes(cause);
      const input = aLine({
        system: {
          nominalVoltageKv: one.nominalVoltageKv,
          highestVoltageKv: one.highestVoltageKv,
          neutralEarthing: 'isolated',
          earthFault: is('earth-fault') ? one.earthFault : 'cleared',
          insulationLevel: is('insulation-level')
            ? { ...levelOf(one.level), levelHoldsToM: one.holdsToM }
            : levelOf(highest),
        },
        site: {
          altitudeM: is('altitude') ? one.altitudeM : 0,
          pollution: {
            class: is('pollution') ? one.pollutionClass : 'b',
            type: 'A',
            basis: 'measured',
            recheckBy: null,
          },
        },
        string: {
          surroundings: is('surroundings') ? one.surroundings : 'cross-arm',
          arcingDevices: is('arcing-devices') ? one.devices : 'none',
          arcGapMm: is('arcing-devices') && one.devices === 'horns' ? 900 : null,
          arrangement: is('extra-units') ? one.arrangement : 'suspension',
          spareUnits: is('extra-units') ? one.spareUnits : 0,
        },
      });
      const { nominalVoltageKv, companyMinimum, originM } = one;
      const minimum = is('minimum') && companyMinimum !== null ? [{ nominalVoltageKv, units: companyMinimum }] : [];
      const settings = companySettings({ companyMinimumUnits: minimum, creepageAltitudeOriginM: originM });
      const insulator = is('unit') ? one.unit : aDisc();
      return evaluate(input, aContext({ insulator, settings }), { trace: false }).string?.units ?? null;
    };
    return BRIDGE_CAUSES.map((_, index) => countOf(index));
  }

  it('adds up, and every step is what a whole evaluation with that input gives', () => {
    fc.assert(
      fc.property(aCase, (one) => {
        const { nominalVoltageKv, companyMinimum, originM } = one;
        const input = aLine({
          system: {
            nominalVoltageKv,
            highestVoltageKv: one.highestVoltageKv,
            neutralEarthing: 'isolated',
            earthFault: one.earthFault,
            insulationLevel: { ...levelOf(one.level), levelHoldsToM: one.holdsToM },
          },
          site: {
            altitudeM: one.altitudeM,
            pollution: { class: one.pollutionClass, type: 'A', basis: 'measured', recheckBy: null },
          },
          string: {
            surroundings: one.surroundings,
            arcingDevices: one.devices,
            arcGapMm: one.devices === 'horns' ? 900 : null,
            arrangement: one.arrangement,
            spareUnits: one.spareUnits,
          },
        });
        const settings = companySettings({
          companyMinimumUnits: companyMinimum === null ? [] : [{ nominalVoltageKv, units: companyMinimum }],
          creepageAltitudeOriginM: originM,
        });
        const { bridge: steps, estimate, units } = ruleOf(input, aContext({ insulator: one.unit, settings }));
        let count = estimate as number;
        const reached = (steps ?? []).map((step) => (count += step.units));
        expect(steps?.map(({ cause }) => cause)).toEqual([...BRIDGE_CAUSES]);
        expect(reached).toEqual(byWholeEvaluations(one));
        expect(count).toBe(units);
      }),
      { numRuns: 300 },
    );
  });

  it('begins from very light contamination on the North American basis', () => {
    for (const contamination of CONTAMINATION_LEVELS) {
      const input = aLine(
        {
          system: { nominalVoltageKv: 138, highestVoltageKv: 145, insulationLevel: rangeOneLevel(null, 650) },
          site: { altitudeM: 1800, pollution: { contamination, basis: 'estimated', recheckBy: null } },
        },
        { basis: 'north-american' },
      );
      const { bridge: steps, estimate, units } = ruleOf(input);
      expect((estimate as number) + steps!.reduce((sum, step) => sum + step.units, 0)).toBe(units);
      const pollution = steps!.find(({ cause }) => cause === 'pollution')!.units;
      expect([contamination, pollution === 0]).toEqual([contamination, contamination === 'very-light']);
    }
  });
});
