import { evaluate } from '../evaluate';
import type { ClearanceRow, Evaluation, SpecificationInput } from '../model';
import { aContext, aLine, aNorthAmericanLine, aSuspensionUnit, rangeOneLevel } from '../testing/specifications';

const METHOD = {
  method: 'north-american',
  shapePhaseToEarth: null,
  shapePhaseToPhase: null,
  fastFrontFrom: null,
  enGap: null,
  externalClearanceMm: null,
  safetySource: null,
} as const;

function at(altitudeM: number, overrides: Partial<SpecificationInput> = {}): Evaluation {
  const input = aNorthAmericanLine({ clearance: METHOD, ...overrides });
  return evaluate({ ...input, site: { ...input.site!, altitudeM } }, aContext({ insulator: aSuspensionUnit() }));
}

const rowsOf = ({ clearances }: Evaluation): ClearanceRow[] =>
  (clearances?.rows ?? []).filter(({ method }) => method === 'north-american');
const valueOf = (evaluation: Evaluation, stress: string, shape: string): number | null | undefined =>
  rowsOf(evaluation).find((row) => row.stress === stress && row.shape === shape)?.valueMm;

describe('the North American method', () => {
  it('has the no-wind row as headline of a line, and the least distance metal to metal between phases', () => {
    const evaluation = at(300);
    // 48 in and, at 145 kV with 650 kV BIL, 63 in
    expect(evaluation.clearances).toMatchObject({ phaseToEarthMm: 1220, phaseToPhaseMm: 1610 });
    expect(rowsOf(evaluation).filter(({ governs }) => governs)).toHaveLength(2);
    // 30, 32 and 40 in of NESC Table 235-6; 12 in
    expect(valueOf(evaluation, 'moderate-wind', 'structure')).toBe(770);
    expect(valueOf(evaluation, 'moderate-wind', 'jointly-used-structure')).toBe(820);
    expect(valueOf(evaluation, 'moderate-wind', 'anchor-guy')).toBe(1020);
    expect(valueOf(evaluation, 'high-wind', 'structure-or-guy')).toBe(310);
  });

  it('divides by the factor of the next higher altitude, and adds by 1,000 ft or part of them', () => {
    const evaluation = at(1500);
    expect(valueOf(evaluation, 'no-wind', 'structure-or-guy')).toBe(Math.ceil((48 * 25.4) / 0.95 / 10) * 10);
    // 4,921 ft: two steps of 0.57 in
    expect(valueOf(evaluation, 'moderate-wind', 'structure')).toBe(Math.ceil(((30 + 2 * 0.57) * 25.4) / 10) * 10);
    const known = rowsOf(evaluation).map(({ stress, source }) => [stress, source.status]);
    expect(known).toContainEqual(['moderate-wind', 'memory']);
    expect(rowsOf(at(300)).find(({ stress }) => stress === 'moderate-wind')?.source.status).toBe('derived');
  });

  it('has the least ground clearance of ANSI C37.32 as headline of a bay', () => {
    const bay = at(300, { kind: 'bay', string: null });
    expect(bay.clearances).toMatchObject({ phaseToEarthMm: 1270, phaseToPhaseMm: 1610 });
    expect(valueOf(bay, 'lightning', 'recommended-to-ground')).toBe(1340);
    expect(valueOf(bay, 'lightning', 'centre-to-centre')).toBe(2490);
    expect(rowsOf(bay).some(({ stress }) => stress === 'no-wind')).toBe(false);
  });

  it('is entered by the maximum operating voltage, and has no figure above the table', () => {
    const system = { ...aNorthAmericanLine().system!, nominalVoltageKv: 220, highestVoltageKv: 245 };
    const insulationLevel = rangeOneLevel(460, 1050);
    const above = at(300, { basis: 'iec', system: { ...system, insulationLevel } });
    expect(above.clearances?.phaseToEarthMm).toBeNull();
    expect(above.notAssessed).toContainEqual({
      part: 'clearances.phaseToEarthMm',
      why: 'No swing clearances are held for 245 kV line to line.',
    });
  });

  it('leaves the spacing to agreement where the table does', () => {
    const system = { ...aNorthAmericanLine().system!, nominalVoltageKv: 500, highestVoltageKv: 550 };
    const bay = at(300, {
      kind: 'bay',
      string: null,
      system: { ...system, insulationLevel: rangeOneLevel(null, 1550) },
    });
    expect(bay.clearances).toMatchObject({ phaseToEarthMm: 3150, phaseToPhaseMm: null });
    expect(bay.notAssessed.find(({ part }) => part === 'clearances.phaseToPhaseMm')?.why).toContain('agreement');
  });

  it('waits for level and kind, and stands beside only on its own basis', () => {
    const system = { ...aNorthAmericanLine().system!, insulationLevel: null };
    expect(at(300, { system }).clearances).toMatchObject({ phaseToEarthMm: 1220, phaseToPhaseMm: null });
    expect(at(300, { kind: null }).clearances).toMatchObject({ phaseToEarthMm: null, phaseToPhaseMm: 1610 });
    expect(rowsOf(evaluate(aLine(), aContext()))).toEqual([]);
    const beside = at(300, { clearance: { ...METHOD, method: 'en-empirical' } });
    expect(rowsOf(beside).length).toBeGreaterThan(0);
    expect(rowsOf(beside).some(({ governs }) => governs)).toBe(false);
  });

  it('shows each line once, and has no figure outside the method', () => {
    const ids = at(2000).trace.map(({ id }) => id);
    expect(ids.filter((id, index) => ids.indexOf(id) !== index)).toEqual([]);
    expect(at(5000).clearances).toMatchObject({ phaseToEarthMm: null, phaseToPhaseMm: null });
    expect(rowsOf(at(5000))).toEqual([]);
  });
});
