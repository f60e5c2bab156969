import type { TraceLine } from '@bellgap/common/api';
import { clearanceName, hasTrace, traceLinesOf } from './trace-names';

const line = (id: string): TraceLine => ({
  id,
  heading: id,
  formula: '',
  substitution: '',
  result: 1,
  unit: '',
  source: { document: '', edition: '', clause: '', status: 'seen' },
});
const lines = [
  'pollution.reference',
  'pollution.creepage',
  'atmosphere.altitude-factor:creepage',
  'string.units-by-creepage',
  'string.count:pollution',
  'atmosphere.altitude-factor:string-lightning',
  'air-gaps.lightning-dry-arc',
  'string.count:lightning',
  'string.test-level:lightning',
  'atmosphere.altitude-factor:clearance phase to earth, lightning, rod-structure',
  'clearances.table:phase-to-earth:lightning:rod-structure',
  'clearances.table:phase-to-earth:lightning:conductor-structure',
  'clearances.row:iec-table:phase-to-earth:lightning:rod-structure',
  'clearances.empirical:phase-to-earth:Del',
  'atmosphere.line-altitude-factor:Del phase to earth at the site',
  'clearances.row:en-empirical:phase-to-earth:Del',
  'clearances.fast-front-voltage:en-theoretical:fast-front',
  'atmosphere.line-altitude-factor:en-theoretical:phase-to-earth:fast-front',
  'air-gaps.fast-front-distance:en-theoretical:phase-to-earth:fast-front',
  'clearances.row:en-theoretical:phase-to-earth:fast-front:window',
  'air-gaps.fast-front-distance:en-theoretical:phase-to-phase:fast-front',
].map(line);
const ids = (name: string) => traceLinesOf(name, lines).map(({ id }) => id);

describe('the working behind a figure', () => {
  it('finds the lines of a criterion and leaves the test levels out', () => {
    expect(ids('string.criteria.pollution')).toHaveLength(5);
    expect(ids('string.criteria.lightning')).toEqual([
      'atmosphere.altitude-factor:string-lightning',
      'air-gaps.lightning-dry-arc',
      'string.count:lightning',
    ]);
    expect(ids('string.testLevels.lightning')).toContain('string.test-level:lightning');
  });

  it('finds the lines of one row of distances, not of its neighbours', () => {
    const table = clearanceName({
      method: 'iec-table',
      distance: 'phase-to-earth',
      stress: 'lightning',
      shape: 'rod-structure',
    });
    expect(ids(table)).toEqual([
      'atmosphere.altitude-factor:clearance phase to earth, lightning, rod-structure',
      'clearances.table:phase-to-earth:lightning:rod-structure',
      'clearances.row:iec-table:phase-to-earth:lightning:rod-structure',
    ]);
    const empirical = clearanceName({ method: 'en-empirical', distance: 'phase-to-earth', stress: 'Del', shape: null });
    expect(ids(empirical)).toHaveLength(3);
    const gap = {
      method: 'en-theoretical',
      distance: 'phase-to-earth',
      stress: 'fast-front',
      shape: 'window',
    } as const;
    expect(ids(clearanceName(gap))).toHaveLength(4);
  });

  it('knows which figures have working', () => {
    expect(hasTrace('string.units')).toBe(true);
    expect(hasTrace('string.massKg')).toBe(false);
  });
});
