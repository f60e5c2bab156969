import { evaluate } from './evaluate';
import type { InsulatorUnit } from './model';
import { aCompositeRod, aContext, aDisc, aLine } from './testing/specifications';
import { nextProfileOf, whatIf, type OtherUnits } from './what-if';

const NO_OTHERS: OtherUnits = { nextProfile: null, other: null, otherCode: null };
const FOG = aDisc({ code: 'U120BP', profile: 'fog', diameterMm: 280, creepageMm: 440 });

/** Checked against the engine's own answer for the changed input: these cases are evaluations, no method of their own. */
describe(whatIf.name, () => {
  const input = aLine({
    site: { altitudeM: 1900, pollution: { class: 'c', type: 'A', basis: 'measured', recheckBy: null } },
  });
  const context = aContext();
  const cases = (others: Partial<OtherUnits> = {}, given = input, within = context) =>
    Object.fromEntries(whatIf(given, within, { ...NO_OTHERS, ...others }).map((one) => [one.id, one]));
  const unitsAt = (changes: Parameters<typeof aLine>[0], within = context) =>
    evaluate(aLine(changes), within, { trace: false }).string;

  it('gives each case beside the input as it is', () => {
    const found = cases({ nextProfile: FOG });
    const before = evaluate(input, context).string;
    expect(Object.keys(found)).toEqual([
      'class-dirtier',
      'altitude-plus-200',
      'one-unit-out',
      'next-profile',
      'other-unit',
    ]);
    for (const one of Object.values(found)) {
      expect(one.before).toMatchObject({
        insulatorCode: 'U120B',
        units: before?.units,
        governedBy: before?.governedBy,
      });
      expect(one.available).toBe(one.after !== null);
      expect(one.available).toBe(one.why === null);
    }
  });

  it('takes the next class, and says where there is none', () => {
    const { 'class-dirtier': found } = cases();
    const dirtier = unitsAt({
      site: { altitudeM: 1900, pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: null } },
    });
    expect(found?.changed).toBe('c to d');
    expect(found?.after).toMatchObject({ units: dirtier?.units, creepageRequiredMm: dirtier?.creepageRequiredMm });
    expect(found!.after!.units!).toBeGreaterThan(found!.before.units!);
    const worst = aLine({ site: { pollution: { class: 'e', type: 'A', basis: null, recheckBy: null } } });
    expect(cases({}, worst)['class-dirtier']).toMatchObject({ available: false, why: 'There is none above e.' });
  });

  it('stands 200 m higher, also beyond a limit of the method', () => {
    const { 'altitude-plus-200': found } = cases();
    expect(found).toMatchObject({ changed: '1900 m to 2100 m', after: { worst: expect.any(String) } });
    const high = aLine({ site: { altitudeM: 4400 } });
    expect(cases({}, high)['altitude-plus-200']?.after).toMatchObject({ units: null, worst: 'stop' });
  });

  it('takes one unit out by the margins that the string itself gives', () => {
    const { 'one-unit-out': found } = cases();
    const { unitsOut, units } = evaluate(input, context).string!;
    const margins = unitsOut.filter((one) => one.unitsOut === 1).map(({ marginPercent }) => marginPercent!);
    expect(found?.after).toMatchObject({ units: units! - 1, marginPercent: Math.min(...margins), worst: 'fail' });
    const rod = aContext({ insulator: aCompositeRod() });
    expect(cases({}, aLine({ string: { insulatorCode: 'C120-220' } }), rod)['one-unit-out']).toMatchObject({
      available: false,
      after: null,
    });
  });

  it('changes the unit, and says why where it cannot', () => {
    const { 'next-profile': fog } = cases({ nextProfile: FOG });
    expect(fog?.changed).toBe('U120B (standard) to U120BP (fog)');
    expect(fog?.after?.units).toBe(evaluate(input, aContext({ insulator: FOG })).string?.units);
    expect(cases()['other-unit']?.why).toBe('No other unit is chosen.');
    expect(cases({ otherCode: 'X1' })['other-unit']?.why).toBe('The catalogue has no insulator unit X1.');
    const extra = aLine({ string: { spareUnits: 1 } });
    expect(cases({ other: aCompositeRod(), otherCode: 'C120-220' }, extra)['other-unit']).toMatchObject({
      available: false,
      why: 'Extra units are for strings of discs; a rod has none.',
    });
  });

  it('says what is missing of an empty input', () => {
    const found = cases({}, { kind: 'line', basis: null, system: null, site: null }, aContext({ insulator: null }));
    for (const { available, why } of Object.values(found)) expect([available, typeof why]).toEqual([false, 'string']);
  });
});

describe(nextProfileOf.name, () => {
  const unit = aDisc();
  const fog = (overrides: Partial<InsulatorUnit>) => aDisc({ profile: 'fog', ...overrides });

  it('keeps family, kind, strength, coupling and spacing', () => {
    const others = [
      fog({ code: 'A', spacingMm: 170 }),
      fog({ code: 'B', failingLoadKn: 160 }),
      fog({ code: 'C', coupling: '20' }),
      fog({ code: 'D', withdrawn: true }),
      fog({ code: 'E', family: 'company' }),
      aDisc({ code: 'F' }),
    ];
    expect(nextProfileOf(unit, others)).toBeNull();
    expect(nextProfileOf(unit, [...others, fog({ code: 'G' })])?.code).toBe('G');
  });

  it('follows the list of profiles, then the creepage', () => {
    const found = [
      aDisc({ code: 'O', profile: 'open' }),
      fog({ code: 'Z', creepageMm: 440 }),
      fog({ code: 'Y', creepageMm: 400 }),
    ];
    expect(nextProfileOf(unit, found)?.code).toBe('Y');
    expect(nextProfileOf(fog({ code: 'Y' }), [aDisc({ code: 'S' }), aDisc({ code: 'O', profile: 'open' })])?.code).toBe(
      'O',
    );
  });
});
