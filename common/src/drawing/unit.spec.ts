import type { InsulatorUnit } from '../engine/model';
import { drawUnit } from './unit';

const unit: InsulatorUnit = {
  code: 'U160BL',
  version: 1,
  family: 'iec-60305',
  kind: 'cap-and-pin',
  material: null,
  profile: 'standard',
  failingLoadKn: 160,
  coupling: '20',
  spacingMm: 170,
  diameterMm: 280,
  averageDiameterMm: null,
  creepageMm: 340,
  creepageIsNominal: true,
  dryArcMm: null,
  massKg: null,
  routineTestLoadKn: null,
  wetFlashover: null,
  note: null,
  source: { document: 'IEC 60305', edition: '1995', clause: 'Table 1', status: 'seen' },
  withdrawn: false,
};

describe('drawUnit', () => {
  it('draws a disc of its own diameter and spacing', () => {
    const drawing = drawUnit(unit);
    const lengths = drawing?.primitives.flatMap((p) =>
      p.kind === 'dimension' ? [Math.hypot(p.to.xMm - p.from.xMm, p.to.yMm - p.from.yMm)] : [],
    );
    expect(lengths?.map((mm) => Math.round(mm * 1000) / 1000)).toEqual([170, 280]);
    expect(drawing?.description).toContain('diameter 280 mm');
  });

  it('draws nothing where the diameter is not known', () => {
    expect(drawUnit({ ...unit, diameterMm: null })).toBeNull();
  });
});
