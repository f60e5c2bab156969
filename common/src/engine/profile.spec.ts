import { evaluate } from './evaluate';
import type { InsulatorUnit, PollutionClass, ShedDimensions, SpecificationInput } from './model';
import { checkProfile } from './profile';
import { aCompositeRod, aContext, aDisc, aLine, aNorthAmericanLine, aSuspensionUnit } from './testing/specifications';

/** Alternating sheds of a composite rod, all within the limits. */
const sheds = (overrides: Partial<ShedDimensions> = {}): ShedDimensions => ({
  spacingMm: 92,
  overhangMm: 62,
  secondOverhangMm: 44,
  clearanceMm: 47,
  pathMm: 171,
  pathClearanceMm: 47,
  underRibs: false,
  ...overrides,
});

const site = (pollutionClass: PollutionClass): SpecificationInput['site'] => ({
  altitudeM: 300,
  pollution: { class: pollutionClass, type: 'A', basis: 'measured', recheckBy: null },
});

function remarks(insulator: InsulatorUnit, pollutionClass: PollutionClass = 'e') {
  const evaluation = evaluate(aLine({}, { site: site(pollutionClass) }), aContext({ insulator }));
  const own = evaluation.cautions.filter(({ code }) => code.startsWith('profile-') || code === 'creepage-factor');
  return {
    evaluation,
    marks: own.map(({ severity, code }) => `${severity} ${code}`),
    text: own.map(({ text }) => text).join('\n'),
    why: evaluation.notAssessed.filter(({ part }) => part === 'string.profile').map(({ why }) => why),
  };
}
const rod = (given: Partial<ShedDimensions> = {}) => aCompositeRod({ sheds: sheds(given) });

// Limits of IEC 60815:1986 Annex D as carried on in IEC TS 60815-2 and -3: from memory, not verified.
describe(checkProfile.name, () => {
  it('notes a profile within its limits, and shows every comparison in the working', () => {
    const { marks, why, text, evaluation } = remarks(rod());
    expect(marks).toEqual(['info profile-within']);
    expect(why).toEqual([]);
    expect(text).toContain(
      'spacing over overhang, distance between sheds, creepage over clearance, difference of overhangs',
    );
    const limits = evaluation.trace.filter(({ id }) => id.startsWith('profile.limit:'));
    expect(limits.map(({ substitution }) => substitution)).toEqual([
      '3.8 <= 4',
      '1.483871 >= 0.65',
      '47 >= 30',
      '3.638298 <= 5',
      '18 >= 15',
    ]);
    for (const { source } of limits) expect(source.status).toBe('memory');
  });

  it.each([
    ['spacing over overhang', { spacingMm: 40 }, 'profile-spacing', 's/p = 40/62 = 0.65, below 0.65'],
    ['distance between sheds', { clearanceMm: 29 }, 'profile-distance', 'c = 29 mm, below 30 mm'],
    ['creepage over clearance', { pathClearanceMm: 34 }, 'profile-path', 'l/d = 171/34 = 5.03, above 5'],
    [
      'difference of overhangs',
      { secondOverhangMm: 48 },
      'profile-alternating',
      'p1 - p2 = 62 - 48 = 14 mm, below 15 mm',
    ],
  ] as const)(
    'raises a caution for %s, with its formula and source, and changes no figure',
    (_, given, code, words) => {
      const { marks, text, evaluation } = remarks(rod(given));
      expect(marks).toEqual([`caution ${code}`]);
      expect(text).toContain(words);
      expect(text).toContain('IEC TS 60815-2 and -3, profile parameters; from memory, not verified');
      expect(evaluation.string).toEqual(remarks(aCompositeRod()).evaluation.string);
    },
  );

  it('passes what is exactly at a limit', () => {
    const atLimits = { spacingMm: 0.65 * 62, clearanceMm: 30, pathMm: 235, secondOverhangMm: 47 };
    expect(remarks(rod(atLimits)).marks).toEqual(['info profile-within']);
  });

  it('lets small sheds stand nearer, and asks more spacing of ribbed ones', () => {
    const small = { overhangMm: 40, secondOverhangMm: 20, clearanceMm: 20 };
    expect(remarks(rod(small)).marks).toEqual(['info profile-within']);
    const spacingMm = 0.7 * 62;
    expect(remarks(rod({ spacingMm, underRibs: false })).marks).toEqual(['info profile-within']);
    expect(remarks(rod({ spacingMm, underRibs: true })).marks).toEqual(['caution profile-spacing']);
    expect(remarks(rod({ spacingMm, underRibs: null })).marks).toEqual(['info profile-ribs-not-known']);
    expect(remarks(rod({ spacingMm: 0.6 * 62, underRibs: null })).marks).toEqual(['caution profile-spacing']);
  });

  it('holds creepage against dry arc by the class of the site, for the whole string', () => {
    // 7600 / 2000 = 3.8: above 3.5 for a to c, below 4 for d and e.
    expect(remarks(rod(), 'c').marks).toEqual(['caution creepage-factor', 'info profile-within']);
    expect(remarks(rod(), 'c').text).toContain('CF = 7600/2000 = 3.8, above 3.5 for classes a to c');
    expect(remarks(rod(), 'd').marks).toEqual(['info profile-within']);
    expect(remarks(aDisc({ creepageMm: 590 }), 'd').marks).toEqual(['caution creepage-factor']);
    expect(remarks(aDisc(), 'a').marks).toEqual([]);
    const american = evaluate(aNorthAmericanLine(), aContext({ insulator: aSuspensionUnit({ creepageMm: 900 }) }));
    expect(american.cautions.map(({ code }) => code)).not.toContain('creepage-factor');
  });

  it('is not assessed without dimensions, and takes the spacing of discs for that of their sheds', () => {
    expect(remarks(aDisc()).why).toEqual(['The catalogue has no dimensions of the sheds of U120B.']);
    const some = sheds({ spacingMm: null, overhangMm: 95, clearanceMm: null, pathMm: null, underRibs: true });
    const disc = remarks(aDisc({ sheds: some }));
    expect(disc.why).toEqual([
      'The catalogue does not have, of U120B: distance between the sheds; creepage and clearance of its narrowest part.',
    ]);
    expect(disc.evaluation.trace.find(({ id }) => id === 'profile.spacing-over-overhang')?.substitution).toBe(
      'r = 146 / 95',
    );
    expect(remarks(rod({ overhangMm: null, spacingMm: null })).why[0]).toBe(
      'The catalogue does not have, of C120-220: spacing and overhang of the sheds; distance between the sheds; overhang of the smaller sheds.',
    );
  });

  it('takes the word of an owner of the print', () => {
    const key = 'iec-ts-60815:profile:creepage factor/classes a to c';
    const confirmation = { edition: '2008', page: '14', on: '2026-03-01', by: 'A. Reader' };
    const evaluation = evaluate(
      aLine({}, { site: site('c') }),
      aContext({ insulator: rod(), confirmations: [{ key, outcome: 'confirmed', ...confirmation }] }),
    );
    expect(evaluation.cautions.find(({ code }) => code === 'creepage-factor')?.text).toContain('; confirmed)');
  });
});
