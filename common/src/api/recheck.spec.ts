import type { SpecificationInput } from '../engine/model';
import { recheckCaution } from './recheck';

describe('re-check of the pollution class', () => {
  const input = (recheckBy: string | null) =>
    ({
      kind: 'line',
      site: { altitudeM: 900, pollution: { class: 'c', type: 'A', basis: 'measured', recheckBy } },
    }) as unknown as SpecificationInput;

  it('is due from the day after the one named', () => {
    expect(recheckCaution(input('2026-05-31'), '2026-05-31')).toBeNull();
    expect(recheckCaution(input('2026-05-31'), '2026-06-01')).toMatchObject({ field: 'site.pollution.recheckBy' });
  });

  it('is never due where no day was named', () => {
    expect(recheckCaution(input(null), '2026-06-01')).toBeNull();
    expect(recheckCaution({ kind: 'line' } as unknown as SpecificationInput, '2026-06-01')).toBeNull();
  });
});
