import { evaluate } from './evaluate';
import type { CompanyRuleCard, RuleOfThumbRow, SpecificationInput } from './model';
import { companyCardUnits, ruleOfThumb } from './rule-of-thumb';
import { aCompositeRod, aContext, aLine, companySettings, rangeOneLevel } from './testing/specifications';

const card = (input: SpecificationInput, id: string, context = aContext()): RuleOfThumbRow => {
  const row = evaluate(input, context).ruleOfThumb.rows.find((one) => one.id === id);
  if (row === undefined) throw new Error(id);
  return row;
};
const at = (nominalVoltageKv: number, highestVoltageKv: number) =>
  aLine({ system: { nominalVoltageKv, highestVoltageKv, insulationLevel: null } });

describe(ruleOfThumb.name, () => {
  // Common practice, no published source: n = Un/15 rounded half up.
  it.each([
    [66, 72.5, 4],
    [132, 145, 9],
    [220, 245, 15],
  ])('takes %d kV over 15 kV a disc', (nominalVoltageKv, highestVoltageKv, estimate) => {
    expect(card(at(nominalVoltageKv, highestVoltageKv), 'discs-by-15-kv').estimate).toBe(estimate);
  });

  it('holds what the sheet has against it, and reads it back', () => {
    expect(card(aLine(), 'discs-by-15-kv')).toMatchObject({ estimate: 9, given: 9, band: 1, verdict: 'within' });
    expect(card(aLine(), 'voltage-by-discs')).toMatchObject({ estimate: 135, given: 132, verdict: 'within' });
    const dirty = aLine({ site: { pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: null } } });
    expect(card(dirty, 'discs-by-15-kv')).toMatchObject({ given: 13, verdict: 'explain' });
  });

  it('is greyed outside 33 to 230 kV and for rods, and says why', () => {
    const outside = card(at(400, 420), 'discs-by-15-kv');
    expect([outside.estimate, outside.inRange, outside.verdict]).toEqual([null, false, 'out-of-range']);
    expect(outside.why).toContain('230 kV');
    expect(card(aLine(), 'discs-by-15-kv', aContext({ insulator: aCompositeRod() })).why).toContain('rods');
  });

  it('compares the specific creepage with the levels of 1986', () => {
    const row = card(aLine(), 'specific-creepage-1986');
    expect([row.estimate, row.verdict]).toEqual([16, 'within']);
    expect(row.given).toBeCloseTo(27.8 / Math.sqrt(3), 9);
  });

  it('compares the lightning clearance with 500 kV per metre', () => {
    const system = { nominalVoltageKv: 220, highestVoltageKv: 245, insulationLevel: rangeOneLevel(460, 1050) };
    expect(card(aLine({ system }), 'lightning-clearance-by-500-kv-per-m')).toMatchObject({
      estimate: 2100,
      given: 2100,
      verdict: 'within',
    });
  });

  it('has the company cards', () => {
    const rule: CompanyRuleCard = {
      id: 'RT-3',
      text: 'One disc per 14 kV, one more per 400 m above 1000 m, two more where the class is d or e',
      kvPerUnit: 14,
      altitudeOriginM: 1000,
      metresPerExtraUnit: 400,
      dirtyClasses: ['d', 'e'],
      dirtyExtraUnits: 2,
      bandUnits: 1,
      minimumVoltageKv: 33,
      maximumVoltageKv: 400,
    };
    expect(companyCardUnits(rule, { nominalVoltageKv: 132, altitudeM: 300, pollutionClass: 'b' })).toBe(9);
    expect(companyCardUnits(rule, { nominalVoltageKv: 132, altitudeM: 1800, pollutionClass: 'e' })).toBe(13);
    const context = aContext({ settings: companySettings({ ruleCards: [rule] }) });
    expect(card(aLine(), 'company-RT-3', context)).toMatchObject({ estimate: 9, given: 9, verdict: 'within' });
  });
});
