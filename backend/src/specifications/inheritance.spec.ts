import type { DesignBasis } from '@bellgap/common/api';
import { inheritanceFaults, inputFromBasis, overrideCautions, takeBasisOver } from './inheritance';

const basis = (highestVoltageKv: number, revision = 2): DesignBasis => ({
  id: 'b',
  number: 'DB-KL221',
  revision,
  basis: 'iec',
  system: {
    nominalVoltageKv: 220,
    highestVoltageKv,
    frequencyHz: 50,
    neutralEarthing: 'effective',
    earthFault: 'cleared',
    insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
    faultCurrentKa: 31.5,
    faultDurationS: 1,
  },
  rules: { unitsOutForLiveWork: 2, maximumStringKinds: 6 },
  note: '',
  createdAt: '2025-06-30T06:00:00Z',
  createdBy: null,
});

describe('inheritance from the design basis', () => {
  it('begins with the basis and chooses nothing else', () => {
    const input = inputFromBasis('line', basis(245));
    expect(input).toMatchObject({ kind: 'line', basis: 'iec', site: null, system: { highestVoltageKv: 245 } });
    expect(Object.keys(input).sort()).toEqual(['basis', 'kind', 'site', 'system']);
    expect(inheritanceFaults(input, basis(245), [])).toEqual([]);
  });

  it('says in words which figure departs from the basis, and lets an override through', () => {
    const input = takeBasisOver(inputFromBasis('line', basis(245)), basis(252), []);
    expect(inheritanceFaults(input, basis(245), [])).toEqual([
      {
        path: 'input.system.highestVoltageKv',
        message:
          'Highest voltage: 252 kV rms differs from 245 kV rms of the design basis DB-KL221 revision 2; override it with a reason, or take the basis',
      },
    ]);
    expect(inheritanceFaults(input, basis(245), [{ path: 'system.highestVoltageKv', reason: '' }])).toEqual([]);
  });

  it('compares an insulation level as a whole, blanks aside', () => {
    const input = inputFromBasis('line', basis(245));
    const level = { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null };
    const withBlank = { ...input, system: { ...input.system!, insulationLevel: { ...level, levelHoldsToM: null } } };
    expect(inheritanceFaults(withBlank, basis(245), [])).toEqual([]);
    const other = { ...input, system: { ...input.system!, insulationLevel: { ...level, lightningKv: 950 } } };
    expect(inheritanceFaults(other, basis(245), []).map(({ path }) => path)).toEqual(['input.system.insulationLevel']);
  });

  it('takes a newer basis over, save what is overridden', () => {
    const input = inputFromBasis('line', basis(220, 1));
    const overrides = [{ path: 'system.nominalVoltageKv', reason: 'temporary' }];
    const own = { ...input, system: { ...input.system!, nominalVoltageKv: 230 } };
    expect(takeBasisOver(own, basis(245), overrides).system).toMatchObject({
      nominalVoltageKv: 230,
      highestVoltageKv: 245,
    });
  });

  it('refuses overrides of what is not inherited, and twice the same', () => {
    const input = inputFromBasis('line', basis(245));
    const overrides = [
      { path: 'site.altitudeM', reason: 'x' },
      { path: 'basis', reason: 'x' },
      { path: 'basis', reason: 'y' },
    ];
    expect(inheritanceFaults(input, basis(245), overrides).map(({ path }) => path)).toEqual([
      'overrides[0].path',
      'overrides[2].path',
    ]);
  });

  it('raises a caution for an override without a reason', () => {
    expect(
      overrideCautions([
        { path: 'system.frequencyHz', reason: ' ' },
        { path: 'basis', reason: 'why' },
      ]),
    ).toEqual([
      {
        code: 'override-without-reason',
        severity: 'caution',
        text: 'Frequency departs from the design basis without a reason; it cannot be submitted for check until one is given',
        field: 'system.frequencyHz',
      },
    ]);
  });
});
