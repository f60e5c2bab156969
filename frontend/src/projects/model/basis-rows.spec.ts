import type { DesignBasis } from '@bellgap/common/api';
import { aDesignBasis } from '../../testing/builders';
import { basisChanges, basisRows } from './basis-rows';

describe('basisRows', () => {
  it('names every value with its unit and its basis', () => {
    const rows = basisRows(aDesignBasis());
    expect(rows).toContainEqual({ label: 'Highest voltage, line to line', text: '245 kV rms' });
    expect(rows).toContainEqual({ label: 'Lightning impulse withstand', text: '1050 kV peak' });
    expect(rows).toContainEqual({ label: 'Switching impulse withstand, phase to earth', text: null });
  });

  it('tells what a revision changed', () => {
    const before: DesignBasis = aDesignBasis({ revision: 1 });
    const after = aDesignBasis({ revision: 2 });
    before.system = { ...before.system, highestVoltageKv: 220 };
    expect(basisChanges(before, after)).toEqual([
      { label: 'Highest voltage, line to line', from: '220 kV rms', to: '245 kV rms' },
    ]);
  });
});
