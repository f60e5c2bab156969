import { drawingCases, suspensionCase, wordsInTheWay } from '@bellgap/common/drawing/fixtures';
import { CHOICE_LABELS, filledPaths } from '@bellgap/common/schemas';
import type { SheetContent } from './content';
import { draftContent, issuedContent, pagesOf, scanned, structureOf } from './fixtures';
import { MissingGlyphError } from './fonts/faces';
import { layOutSheet } from './layout';
import type { Element, Mark } from './layout/marks';
import { renderSheet } from './render-sheet';

// Pages are printed and scanned here, and other tests share the machine.
jest.setTimeout(120_000);

const PAPERS = ['A4', 'Letter'] as const;
const on = (paper: 'A4' | 'Letter', content: SheetContent): SheetContent => ({
  ...content,
  project: { ...content.project, paper },
});
const PT_PER_MM = 72 / 25.4;
const flat = (elements: Element[]): Element[] => elements.flatMap((item) => [item, ...flat(item.children)]);
/** The word from corner to corner, sign by sign. */
const ACROSS = /^D\s*R\s*A\s*F\s*T\s/;
const joined = (page: string): string => page.replace(/\s+/g, ' ');

/** Side of the square code with the quiet zone of four modules that is drawn around it, in millimetres. */
function squareSideMm(marks: Mark[]): number {
  const square = marks.find((mark) => mark.kind === 'outline' && mark.colour === '#000000');
  if (square?.kind !== 'outline') throw new Error('no square code');
  const left = [...square.data.matchAll(/M(\S+)/g)].map((match) => Number(match[1]));
  const right = [...square.data.matchAll(/H(\S+?)V/g)].map((match) => Number(match[1]));
  const drawn = Math.max(...right) - Math.min(...left);
  return (drawn * (33 + 8)) / 33 / PT_PER_MM;
}

describe('an issued sheet', () => {
  it.each(PAPERS)('says on each page what it is and where to look it up, on %s', async (paper) => {
    const { bytes, pages } = await renderSheet(on(paper, issuedContent(suspensionCase)));
    const texts = pagesOf(bytes).map(joined);
    expect(texts).toHaveLength(pages);
    texts.forEach((text, i) => {
      expect(text).toContain('INS-221-003 revision 0 content code 4f09b2a77c31');
      expect(text).toContain('verification code 7K2M-94QX-HV3N-C8TA');
      expect(text).toContain(
        'Uncontrolled when printed: look up the verification code at https://sheets.kigc.example/verify/7K2M94QXHV3NC8TA',
      );
      expect(text).toContain(`page ${i + 1} of ${pages}`);
      expect(text).not.toMatch(/undefined|\bnull\b|NaN/);
    });
  });

  it('carries no mark of a draft', async () => {
    const { bytes } = await renderSheet(issuedContent(suspensionCase));
    for (const page of pagesOf(bytes, 'raw'))
      expect(page).not.toMatch(/D\s*R\s*A\s*F\s*T\b|\bdraft\b|not for ordering, not/i);
  });

  it('names who drafted, checked and approved it, with dates and their zone, on the first page', async () => {
    const { bytes } = await renderSheet(issuedContent(suspensionCase));
    const first = joined(pagesOf(bytes)[0] ?? '');
    for (const words of ['Tamsin Orvelle', 'Ruben Castellary', 'Amara Holvenstein', 'Issued'])
      expect(first).toContain(words);
    expect(first).toContain('2026-03-12 2026-03-17 2026-03-19');
    expect(first).toContain("Dates and times are those of the site's time zone, Etc/GMT-4 (UTC+04:00).");
    expect(first).toContain('1 concession a requirement is not met and was conceded for a time, until 2026-12-31');
    expect(first).toContain('1 acceptance');
    expect(first).toContain('1 not waited for');
  });

  it('names the issue that it supersedes, and the category of the check', async () => {
    const [first, second] = issuedContent(suspensionCase).issued!.revisionHistory;
    const revisionHistory = [
      { ...first!, label: '0', on: '2025-11-04' },
      { ...second!, label: '1', on: '2026-03-19' },
    ];
    const { bytes } = await renderSheet(issuedContent(suspensionCase, { revision: '1' }, { revisionHistory }));
    const page = joined(pagesOf(bytes)[0] ?? '');
    expect(page).toContain('Supersedes revision 0 of 2025-11-04.');
    expect(page).toContain('checked, category 2');
  });

  it('counts what was conceded, with the first end', () => {
    const content = issuedContent(suspensionCase);
    const [acceptance, concession] = content.issued!.concessions;
    const concessions = [acceptance!, { ...concession!, validUntil: '2027-06-30' }, concession!];
    const words = flat(layOutSheet({ ...content, issued: { ...content.issued!, concessions } }).elements)
      .map(({ marks }) => marks.map((mark) => (mark.kind === 'text' ? mark.text : '')).join(' '))
      .join('|');
    expect(words).toContain(
      '2 concessions a requirement is not met and was conceded for a time, the first until 2026-12-31',
    );
    expect(words).toContain('1 acceptance outside a source');
  });

  it('carries check record, remarks with answers, concessions with their ends, and its revisions', async () => {
    const { bytes } = await renderSheet(issuedContent(suspensionCase));
    const text = joined(pagesOf(bytes).join(' '));
    for (const words of [
      'Valid until 2026-12-31',
      'It is moved before the line is energised.',
      'Given by Amara Holvenstein, 2026-03-19 13:30',
      'Revision 3 changes the yard only.',
      'category 2, independent check',
      'declared: no part in the work',
      '2026-03-17 02:05 before those of the author were shown',
      'Class d asks for 25 mm/kV more',
      'Pass with notes',
      '−11.8 %',
      'Design basis DB-KL221 rev 2, page 4',
      'NOT agreed',
      'Loads are on sheet MEC-221-001',
      'All structures of the zone have cross-arms',
      'Answer by Tamsin Orvelle, 2026-03-12 09:10: Right, corrected; the clearance grows.',
      'Closed by Ruben Castellary, 2026-03-17 02:30.',
      'an earlier submission, not what is issued here',
      'Surroundings corrected from',
      'First issue',
      '9c0d1e6f5b7a40c8f2d3e4a5b6c7d8e9f00112233445566778899aabbccddeeff',
    ])
      expect(text).toContain(words);
  });

  it.each(PAPERS)('can be scanned on every page, printed in one ink, on %s', async (paper) => {
    const content = on(paper, issuedContent(suspensionCase));
    const { bytes, pages } = await renderSheet(content);
    const sheet = layOutSheet(content);
    for (let page = 1; page <= pages; page += 1)
      expect(scanned(bytes, page, paper)).toBe('https://sheets.kigc.example/verify/7K2M94QXHV3NC8TA');
    const figure = flat(sheet.elements).find(({ alt }) => alt?.startsWith('QR code'));
    expect(squareSideMm(figure?.marks ?? [])).toBeGreaterThanOrEqual(18);
    for (const { before } of sheet.artifacts.slice(1)) expect(squareSideMm(before)).toBeGreaterThanOrEqual(14);
  });

  it('can be scanned with a long address too', async () => {
    const verificationUrl = `https://${'sheets-of-the-northern-lines.'.repeat(2)}kigc.example/verify/7K2M94QXHV3NC8TA`;
    const content = issuedContent(suspensionCase, {}, { verificationUrl });
    const { bytes } = await renderSheet(content);
    expect(scanned(bytes, 2, 'A4')).toBe(verificationUrl);
  });

  it('gives the same bytes for the same content, and others where a seal differs', async () => {
    const one = await renderSheet(issuedContent(suspensionCase));
    const same = await renderSheet(structuredClone(issuedContent(suspensionCase)));
    const other = await renderSheet(issuedContent(suspensionCase, {}, { lastSeal: null }));
    expect(one.bytes.equals(same.bytes)).toBe(true);
    expect(one.bytes.equals(other.bytes)).toBe(false);
    expect(one.bytes.toString('latin1')).toContain('D:20260319000000Z');
  });

  it('is read aloud with its code: right after the title block, the square with words in its place', async () => {
    const { bytes } = await renderSheet(issuedContent(suspensionCase));
    expect(bytes.toString('latin1')).toContain('/Alt (QR code of https://sheets.kigc.example/verify/7K2M94QXHV3NC8TA)');
    const structure = joined(structureOf(bytes));
    expect(structure).toMatch(/approved Amara Holvenstein 2026-03-19/);
    expect(structure).toMatch(
      /Title block.*Verification.*verification code 7K2M-94QX-HV3N-C8TA.*Uncontrolled when printed/,
    );
    expect(structure).toMatch(
      /Accepted, conceded, not waited for.*Concession.*Check record.*Remarks and answers.*Revisions/,
    );
  });

  it.each(drawingCases)('has room on its first page for the drawing and all required values: $name', (drawingCase) => {
    for (const paper of PAPERS) {
      for (const content of [draftContent(drawingCase), issuedContent(drawingCase)]) {
        const sheet = layOutSheet(on(paper, content));
        const first = flat(sheet.elements.filter(({ page }) => page === 0));
        const drawing = first.flatMap(({ marks }) => marks).find((mark) => mark.kind === 'drawing');
        if (drawing?.kind !== 'drawing') throw new Error(`no drawing on ${paper}`);
        expect({ paper, state: content.state, inTheWay: wordsInTheWay(drawing.drawing) }).toEqual({
          paper,
          state: content.state,
          inTheWay: [],
        });
        const words = first.map(({ marks }) => marks.map((mark) => (mark.kind === 'text' ? mark.text : '')).join(' '));
        for (const label of ['Creepage needed', 'Dry arc needed', 'Distance to earth', 'Between phases'])
          expect(words).toContain(label);
      }
    }
  });

  it('draws a tension set and a V at a scale that can be read', () => {
    const scaleOf = (name: string, paper: (typeof PAPERS)[number]): number => {
      const drawingCase = drawingCases.find((one) => one.name === name)!;
      const marks = flat(layOutSheet(on(paper, issuedContent(drawingCase))).elements).flatMap((item) => item.marks);
      const drawing = marks.find((mark) => mark.kind === 'drawing');
      return drawing?.kind === 'drawing' ? Math.round(72 / 25.4 / drawing.pointsPerMm) : Infinity;
    };
    expect(scaleOf('tension set of two strings with horns', 'A4')).toBeLessThanOrEqual(50);
    expect(scaleOf('tension set of two strings with horns', 'Letter')).toBeLessThanOrEqual(50);
    expect(scaleOf('V string with horns', 'A4')).toBeLessThanOrEqual(60);
    expect(scaleOf('V string with horns', 'Letter')).toBeLessThanOrEqual(75);
  });

  it.each(drawingCases)('keeps every word above the foot: $name', (drawingCase) => {
    for (const paper of PAPERS) {
      const sheet = layOutSheet(on(paper, issuedContent(drawingCase)));
      const verification = new Set(flat(sheet.elements.filter(({ title }) => title === 'Verification')));
      for (const item of flat(sheet.elements)) {
        for (const mark of item.marks) {
          if (mark.kind !== 'text') continue;
          expect(mark.x).toBeGreaterThan(45);
          expect(mark.x + mark.width).toBeLessThan(sheet.widthPt - (verification.has(item) ? 70 : 25));
          expect(mark.baseline).toBeLessThan(
            sheet.heightPt - (verification.has(item) ? 28 : item.page === 0 ? 85 : 75),
          );
        }
      }
    }
  });

  it('tells the rows of a list apart, and prints their choices as words', () => {
    const content = issuedContent(suspensionCase);
    const [check] = content.issued!.checkRecords;
    const wind = { name: 'Wind', kind: 'wind' as const, conductorWeightNPerM: 14.2, windPressurePa: 600 };
    const cases = [wind, { ...wind, name: 'Ice', kind: 'ice' as const, iceRadialMm: 20 }];
    const input = { ...content.input, mechanical: { basis: 'rd-223' as const, cases } } as SheetContent['input'];
    const ticks = filledPaths(input).map((path) => ({ path, seenIn: '', agreed: true }));
    const issued = { ...content.issued!, checkRecords: [{ ...check!, ticks }] };
    const words = flat(layOutSheet({ ...content, input, issued }).elements)
      .map(({ marks }) => marks.map((mark) => (mark.kind === 'text' ? mark.text : '')).join(' '))
      .join('|');
    expect(words).toContain(`Kind of case, row 1|${CHOICE_LABELS.loadCaseKind.wind}|`);
    expect(words).toContain(`Kind of case, row 2|${CHOICE_LABELS.loadCaseKind.ice}|`);
    expect(words).toContain('Ice all round, row 2|20 mm|');
    expect(words).toContain(`|${CHOICE_LABELS.mechanicalBasis['rd-223']}|`);
  });

  it('holds the longest texts that may be entered, and repeats the heads of its tables', () => {
    const content = issuedContent(suspensionCase);
    const issued = content.issued!;
    const [check] = issued.checkRecords;
    const long = (signs: number): string => 'worth of words '.repeat(signs).slice(0, signs).trim();
    const full: SheetContent = {
      ...content,
      issued: {
        ...issued,
        concessions: issued.concessions.map((one) => ({ ...one, text: long(2000), reason: long(1000) })),
        remarks: issued.remarks.map((one) => ({
          ...one,
          text: long(2000),
          answers: Array.from({ length: 4 }, (_, i) => ({
            id: `${i}`,
            text: long(2000),
            by: 'Tamsin Orvelle',
            at: '2026-03-12T05:10:00.000Z',
          })),
        })),
        checkRecords: [
          {
            ...check!,
            differenceReason: long(1000),
            verdictNote: long(1000),
            ownFigures: { ...check!.ownFigures, note: long(1000) },
            ticks: filledPaths(content.input).map((path) => ({ path, seenIn: long(200), agreed: true })),
            checklist: check!.checklist.map((entry) => ({ ...entry, note: long(500) })),
          },
        ],
      },
    };
    const sheet = layOutSheet(full);
    for (const { title, marks, page } of flat(sheet.elements)) {
      if (title === 'Verification' || page === 0) continue;
      for (const mark of marks) if (mark.kind === 'text') expect(mark.baseline).toBeLessThan(sheet.heightPt - 75);
    }
    const heads = sheet.artifacts.filter(({ before }) =>
      before.some((mark) => mark.kind === 'text' && mark.text === 'seen in'),
    );
    expect(heads.length).toBeGreaterThanOrEqual(1);
  });

  it('is refused where a note of the checker has a sign that no face can draw', async () => {
    const content = issuedContent(suspensionCase);
    const [check] = content.issued!.checkRecords;
    const spoiled = { ...content, issued: { ...content.issued!, checkRecords: [{ ...check!, verdictNote: '線' }] } };
    await expect(renderSheet(spoiled)).rejects.toThrow(MissingGlyphError);
  });

  it.each(['draft', 'in_check', 'checked'] as const)(
    'is not what is %s: DRAFT, no code, no check record',
    async (state) => {
      const { bytes } = await renderSheet(draftContent(suspensionCase, { state }));
      for (const page of pagesOf(bytes, 'raw')) {
        expect(page).toMatch(ACROSS);
        expect(page).not.toMatch(/verification code|content code|Check record/);
      }
      expect(layOutSheet(draftContent(suspensionCase, { state })).draftWord).toBe('DRAFT');
      expect(layOutSheet(issuedContent(suspensionCase)).draftWord).toBeNull();
    },
  );
});
