import type { Caution, SpecificationInput, TraceLine } from '@bellgap/common/api';
import type { StoredRevision } from '../specifications/specifications.service';
import { assumedOf, changesFrom, disputedOf, mattersOf } from './approval';
import { issueFaults } from './issue-bars';

const caution = (severity: Caution['severity'], text: string): Caution => ({ code: 'c', severity, text, field: null });
const line = (heading: string, status: TraceLine['source']['status']): TraceLine => ({
  id: heading,
  heading,
  formula: '',
  substitution: '',
  result: 1,
  unit: '',
  source: { document: 'Doc', edition: '2001', clause: '4', status },
});
const answer = (parts: object) => ({ cautions: [], trace: [], ...parts }) as unknown as StoredRevision['evaluation'];

describe('what an approver is shown', () => {
  it('names each matter once', () => {
    const cautions = [caution('fail', 'short'), caution('fail', 'short'), caution('caution', 'unusual')];
    expect(mattersOf({ cautions }, 'fail')).toEqual([{ code: 'c', field: null, text: 'short' }]);
  });

  it('gathers what rests on an assumption, sources from memory with the lines that rest on them', () => {
    const input = {
      kind: 'line',
      site: { altitudeM: 900, pollution: { class: 'c', type: 'A', basis: 'assumed', recheckBy: null } },
      string: { surroundings: 'open' },
      system: { insulationLevel: { lightningKv: 1050, levelHoldsToM: null } },
    } as unknown as SpecificationInput;
    const trace = [line('One', 'memory'), line('Two', 'memory'), line('Three', 'seen'), line('Four', 'practice')];
    const assumed = assumedOf({ input, evaluation: answer({ trace }) });
    expect(assumed.map(({ path }) => path)).toEqual([
      'site.pollution.basis',
      'string.surroundings',
      'system.insulationLevel.levelHoldsToM',
      null,
      null,
    ]);
    expect(assumed[3]!.text).toBe('One; Two: from memory, not verified (Doc, 2001, 4)');
  });

  it('says who recorded that a print differs', () => {
    const cautions = [
      {
        ...caution('acceptance', 'An owner of the print found that it differs: iec-60305:U160BL.'),
        code: 'figure-disputed',
      },
    ];
    const record = {
      key: 'iec-60305:U160BL',
      outcome: 'disputed',
      edition: '2021',
      page: 'page 7',
      on: '2026-02-01',
      by: 'Edda Rowan',
    } as const;
    const [found] = disputedOf({ cautions }, { confirmations: [record] });
    expect(found).toMatchObject({
      key: 'iec-60305:U160BL',
      note: 'Edda Rowan recorded on 2026-02-01 that 2021, page 7 differs',
    });
  });

  it('compares titles, inputs row by row, and reasons of overrides', () => {
    const content = (altitudeM: number, name: string, reason: string) => ({
      title: 'Strings',
      input: { kind: 'line', site: { altitudeM }, mechanical: { cases: [{ name }] } } as unknown as SpecificationInput,
      overrides: [{ path: 'system.faultCurrentKa', reason }],
    });
    expect(changesFrom(content(900, 'Wind', 'a'), content(950, 'Ice', 'b'))).toEqual([
      { path: 'site.altitudeM', from: 900, to: 950 },
      { path: 'mechanical.cases[0].name', from: 'Wind', to: 'Ice' },
      { path: 'overrides.system.faultCurrentKa', from: 'a', to: 'b' },
    ]);
  });
});

describe('what an issue lacks', () => {
  const evaluation = answer({ cautions: [caution('acceptance', 'outside'), caution('fail', 'short')] });
  const matter = (text: string) => ({ code: 'c', field: null, text, reason: 'because' });
  const none = { acceptances: [], concessions: [], laterChangesReason: null };
  const faultsOf = (given: object, laterChanges: { code: string; text: string }[] = []) =>
    issueFaults({ ...none, ...given }, { evaluation }, { laterChanges, today: '2026-03-16' });

  it('is named beside its field', () => {
    expect(faultsOf({})).toEqual([
      { path: 'acceptances', message: 'Needs a reason: outside' },
      { path: 'concessions', message: 'Needs a concession with its end: short' },
    ]);
    const whole = {
      acceptances: [matter('outside')],
      concessions: [{ ...matter('short'), validUntil: '2026-03-17' }],
    };
    expect(faultsOf(whole)).toEqual([]);
    expect(faultsOf(whole, [{ code: 'basis', text: 'Newer.' }]).map(({ path }) => path)).toEqual([
      'laterChangesReason',
    ]);
    const ended = { ...whole, concessions: [{ ...matter('short'), validUntil: '2026-03-16' }] };
    expect(faultsOf(ended).map(({ path }) => path)).toEqual(['concessions[0].validUntil']);
    const twice = { ...whole, acceptances: [matter('outside'), matter('outside')] };
    expect(faultsOf(twice).map(({ path }) => path)).toEqual(['acceptances[1].text']);
  });
});
