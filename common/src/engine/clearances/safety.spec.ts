import { evaluate } from '../evaluate';
import type { ClearanceInput, ClearanceRow, Evaluation, InsulationLevelInput } from '../model';
import { SAFETY_DISTANCES } from '../standards';
import { aContext, aLine, rangeOneLevel, rangeTwoLevel } from '../testing/specifications';

interface Case {
  safetySource: ClearanceInput['safetySource'];
  highestVoltageKv?: number;
  insulationLevel?: InsulationLevelInput | null;
  altitudeM?: number;
  shapePhaseToEarth?: ClearanceInput['shapePhaseToEarth'];
  method?: ClearanceInput['method'];
}

function assess(given: Case): Evaluation {
  const { safetySource, highestVoltageKv = 245, insulationLevel = rangeOneLevel(460, 1050), altitudeM = 1000 } = given;
  const { shapePhaseToEarth = 'rod-structure', method = 'iec-table' } = given;
  const clearance: ClearanceInput = {
    method,
    shapePhaseToEarth,
    shapePhaseToPhase: null,
    fastFrontFrom: null,
    enGap: null,
    externalClearanceMm: null,
    safetySource,
  };
  return evaluate(
    aLine(
      { system: { nominalVoltageKv: null, highestVoltageKv, insulationLevel }, site: { altitudeM }, clearance },
      { kind: 'bay', string: null },
    ),
    aContext({ insulator: null }),
  );
}

const rowsOf = ({ clearances }: Evaluation): ClearanceRow[] =>
  (clearances?.rows ?? []).filter(({ distance }) => distance === 'safety');
const mm = (evaluation: Evaluation, kind: string): number | null | undefined =>
  rowsOf(evaluation).find(({ stress }) => stress === kind)?.valueMm;
const severities = ({ cautions }: Evaluation): string[] => cautions.map(({ code, severity }) => `${severity} ${code}`);

describe('safety distances', () => {
  it('are rows of their own kind that never enter another distance', () => {
    const without = assess({ safetySource: null });
    const chosen = assess({ safetySource: 'rd-337' });
    expect(rowsOf(without)).toEqual([]);
    expect(rowsOf(chosen)).toHaveLength(9);
    expect(rowsOf(chosen).some(({ governs }) => governs)).toBe(false);
    expect(chosen.clearances).toMatchObject({
      phaseToEarthMm: without.clearances?.phaseToEarthMm,
      phaseToPhaseMm: without.clearances?.phaseToPhaseMm,
    });
  });

  it('after RD 337/2014 are read in print; after IEC 61936-1 they have to be accepted', () => {
    const seen = assess({ safetySource: 'rd-337' });
    expect(new Set(rowsOf(seen).map(({ source }) => source.status))).toEqual(new Set(['seen']));
    expect(severities(seen)).not.toContain('acceptance safety-source-from-memory');
    const recalled = assess({ safetySource: 'iec-61936-1' });
    expect(new Set(rowsOf(recalled).map(({ source }) => source.status))).toEqual(new Set(['memory']));
    expect(severities(recalled)).toContain('acceptance safety-source-from-memory');
  });

  it('after IEC 61936-1 start from the corrected N, after RD 337/2014 from the printed one and its own rule', () => {
    // N of 1050 kV at 2310 m is 2470 mm by the tables, 2100 mm x 1.196 by the decree
    expect(mm(assess({ safetySource: 'iec-61936-1', altitudeM: 2310 }), 'height-over-access')).toBe(2470 + 2250);
    const decree = assess({ safetySource: 'rd-337', altitudeM: 2310 });
    expect(mm(decree, 'height-over-access')).toBe(Math.ceil((2100 * 1.196 + 2500) / 10) * 10);
    expect(rowsOf(decree).find(({ stress }) => stress === 'vehicle')?.altitudeFactor).toBeCloseTo(1.196, 12);
  });

  it('keep to the least figures and to the voltages that a row is for', () => {
    const low = { highestVoltageKv: 24, insulationLevel: rangeOneLevel(50, 125) };
    const decree = assess({ safetySource: 'rd-337', ...low });
    expect([mm(decree, 'vehicle'), mm(decree, 'outdoor-obstacle')]).toEqual([500, 1250]);
    expect(mm(decree, 'insulator-base-height')).toBe(2300);
    const recalled = assess({ safetySource: 'iec-61936-1', ...low });
    expect(mm(recalled, 'height-over-access')).toBe(2500);
    expect(mm(recalled, 'height-outside-boundary')).toBe(4300);
    expect(rowsOf(recalled).filter(({ stress }) => stress === 'mesh-or-screen')).toMatchObject([
      { shape: 'B3', valueMm: 300 },
    ]);
    expect(mm(assess({ safetySource: 'iec-61936-1' }), 'height-outside-boundary')).toBe(6600);
  });

  it('take the larger of lightning and switching in range II, and the larger shape where none is chosen', () => {
    const level = { highestVoltageKv: 420, insulationLevel: rangeTwoLevel(1050, 1.5, 1425) };
    const conductor = assess({ safetySource: 'rd-337', shapePhaseToEarth: 'conductor-structure', ...level });
    expect(mm(conductor, 'height-over-access')).toBe(2600 + 2500);
    expect(mm(assess({ safetySource: 'rd-337', shapePhaseToEarth: null, ...level }), 'height-over-access')).toBe(5900);
  });

  it('end where the decree ends, while those of IEC 61936-1 go on', () => {
    const beyond = assess({ safetySource: 'rd-337', altitudeM: 3001 });
    const added = rowsOf(beyond).filter(({ stress }) => stress !== 'insulator-base-height');
    expect(added.every(({ valueMm, withinSource }) => valueMm === null && !withinSource)).toBe(true);
    expect(severities(beyond)).toContain('stop clearance-safety-beyond-source');
    expect(mm(assess({ safetySource: 'rd-337', altitudeM: 3000 }), 'vehicle')).toBe(2790);
    expect(mm(assess({ safetySource: 'iec-61936-1', altitudeM: 3001 }), 'vehicle')).toBeGreaterThan(2700);
  });

  it.each(['rd-337', 'iec-61936-1'] as const)('are not assessed without a level: %s', (safetySource) => {
    const evaluation = assess({ safetySource, insulationLevel: null });
    expect(rowsOf(evaluation)).toEqual([]);
    expect(evaluation.notAssessed.map(({ part }) => part)).toContain('clearances.safety');
  });

  it('stand on the tables also where a line method gives the headline', () => {
    expect(mm(assess({ safetySource: 'rd-337', method: 'en-empirical' }), 'height-over-access')).toBe(4600);
  });

  it('show each line once', () => {
    for (const safetySource of ['rd-337', 'iec-61936-1'] as const) {
      const ids = assess({ safetySource, shapePhaseToEarth: null, altitudeM: 1700 }).trace.map(({ id }) => id);
      expect(ids.filter((id, index) => ids.indexOf(id) !== index)).toEqual([]);
    }
  });

  it('are told apart by their rows', () => {
    const keys = SAFETY_DISTANCES.rows.map((row) => [row.source, row.kind, row.symbol, row.upToVoltageKv].join());
    expect(new Set(keys).size).toBe(keys.length);
  });
});
