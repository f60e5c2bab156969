import { aWorksheet } from '@bellgap/common/testing';
import { aDesignBasis } from '../../testing/builders';
import { levelHoldsFrom } from './inheritance';

describe('the altitude up to which a level holds', () => {
  const { system } = aDesignBasis();
  const inputOf = (levelHoldsToM: number | null) => ({
    system: { ...system, insulationLevel: { ...system.insulationLevel!, levelHoldsToM } },
  });
  const basis = aDesignBasis({ ...inputOf(2310), worksheet: aWorksheet({ altitudeM: 2310 }) });

  it('is said to come from the basis, and from its worksheet where it keeps one', () => {
    expect(levelHoldsFrom(inputOf(2310), basis)).toContain('from DB-KL221 revision 2, whose worksheet');
    expect(levelHoldsFrom(inputOf(2310), { ...basis, worksheet: null })).toBe('from DB-KL221 revision 2');
  });

  it('is not where the sheet departs from it, where the basis is silent, and where there is none', () => {
    expect(levelHoldsFrom(inputOf(1500), basis)).toBeNull();
    expect(levelHoldsFrom(inputOf(null), aDesignBasis())).toBeNull();
    expect(levelHoldsFrom(inputOf(2310), null)).toBeNull();
  });

  it('is not said to be worked out where the worksheet is for another', () => {
    const other = { ...basis, worksheet: aWorksheet({ altitudeM: 1000 }) };
    expect(levelHoldsFrom(inputOf(2310), other)).toBe('from DB-KL221 revision 2');
  });
});
