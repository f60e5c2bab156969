import type { SpecificationInput } from '@bellgap/common/api';
import { allWords, drawString } from '@bellgap/common/drawing';
import { answer, discUnit, drawingCases, suspensionCase } from '@bellgap/common/drawing/fixtures';
import { draftContent, pagesOf } from './fixtures';
import { MissingGlyphError } from './fonts/faces';
import { renderSheet } from './render-sheet';
import { layOutSheet } from './layout';
import type { Element, Mark } from './layout/marks';

const flat = (elements: Element[]): Element[] => elements.flatMap((item) => [item, ...flat(item.children)]);
const wordsOf = (marks: Mark[]): string => marks.map((mark) => (mark.kind === 'text' ? mark.text : '')).join('');

describe('the sheet as PDF', () => {
  it('gives the same bytes for the same content, and other bytes for another', async () => {
    const one = await renderSheet(draftContent(suspensionCase));
    const same = await renderSheet(structuredClone(draftContent(suspensionCase)));
    const other = await renderSheet(draftContent(suspensionCase, { revision: 'C' }));
    expect(one.bytes.equals(same.bytes)).toBe(true);
    expect(one.bytes.equals(other.bytes)).toBe(false);
    expect(one.bytes.subarray(0, 8).toString()).toBe('%PDF-1.7');
  });

  it('is tagged, named, dated by its content, and embeds three faces', async () => {
    const { bytes, pages } = await renderSheet(draftContent(suspensionCase));
    const text = bytes.toString('latin1');
    expect(text.match(/\/Type \/Page\b/g)).toHaveLength(pages);
    for (const part of ['/MarkInfo', '/StructTreeRoot', '/Lang (en-GB)', '/Outlines', 'D:20260312000000Z'])
      expect(text).toContain(part);
    expect([...new Set(text.match(/\/BaseFont \/[A-Z]{6}\+\S+/g))]).toHaveLength(3);
  });

  it.each(drawingCases)('keeps every word on its page, with words apart: $name', (drawingCase) => {
    for (const paper of ['A4', 'Letter'] as const) {
      const content = draftContent(drawingCase);
      const sheet = layOutSheet({ ...content, project: { ...content.project, paper } });
      for (const { marks } of flat(sheet.elements)) {
        for (const mark of marks) {
          if (mark.kind === 'text') {
            expect(mark.x).toBeGreaterThan(45);
            expect(mark.x + mark.width).toBeLessThan(sheet.widthPt - 25);
            expect(mark.baseline).toBeLessThan(sheet.heightPt - 30);
          }
          if (mark.kind === 'drawing') {
            expect(mark.x + mark.drawing.widthMm * mark.pointsPerMm).toBeLessThan(sheet.widthPt - 25);
            expect(mark.drawing.textHeightMm * mark.pointsPerMm).toBeGreaterThan(6);
          }
        }
      }
    }
  });

  it('shows the same drawing as the screen: the words and the numbers of the primitives', () => {
    const { input, context, evaluation } = suspensionCase;
    const figure = layOutSheet(draftContent(suspensionCase)).elements.find(({ tag }) => tag === 'Figure');
    const drawing = figure?.marks[0];
    if (drawing?.kind !== 'drawing') throw new Error('no drawing');
    const onScreen = drawString(input, context, evaluation)!;
    expect(allWords(drawing.drawing).map(({ text }) => text)).toEqual(allWords(onScreen).map(({ text }) => text));
    expect(figure?.alt).toContain('section length 2,890 mm');
  });

  it('repeats the heads of a table that runs over pages, and numbers each page', () => {
    const long = answer(discUnit(), 17);
    long.trace = Array.from({ length: 60 }, (_, i) => ({
      ...long.trace[i % long.trace.length]!,
      heading: `Line ${i}`,
    }));
    const sheet = layOutSheet(draftContent({ ...suspensionCase, evaluation: long }));
    const pages = sheet.artifacts.length;
    const repeated = sheet.artifacts.filter(({ before }) =>
      before.some((mark) => mark.kind === 'text' && mark.text === 'formula and substitution'),
    );
    expect(repeated.length).toBeGreaterThanOrEqual(2);
    sheet.artifacts.forEach(({ before }, page) => {
      expect(before.map((mark) => (mark.kind === 'text' ? mark.text : ''))).toContain(`page ${page + 1} of ${pages}`);
    });
  });

  it('names the sign that no face can draw', async () => {
    const content = draftContent(suspensionCase, { title: 'Strings 線' });
    await expect(renderSheet(content)).rejects.toThrow(MissingGlyphError);
    await expect(renderSheet(content)).rejects.toThrow('no sign for "線" (U+7DDA) in "Strings 線"');
  });

  it('refuses a date that is none', async () => {
    await expect(renderSheet(draftContent(suspensionCase, { drawnOn: 'today' }))).rejects.toThrow('YYYY-MM-DD');
  });

  it('says what is missing when nothing is filled in', () => {
    const input: SpecificationInput = { kind: 'line', basis: null, system: null, site: null };
    const evaluation = { ...answer(discUnit(), 1), string: null, clearances: null, trace: [], cautions: [] };
    const bare = draftContent(suspensionCase, { input, evaluation, basis: null, overrides: [], drafted: null });
    const sheet = layOutSheet({ ...bare, context: { ...bare.context, insulator: null } });
    const words = flat(sheet.elements).map(({ marks }) => wordsOf(marks));
    expect(words).toContain('No insulator unit chosen');
    expect(words).toContain('not stated');
    expect(words.join(' ')).not.toMatch(/undefined|null|NaN/);
  });

  it('carries the bridge from the rule to the count, with signs', () => {
    const { evaluation } = suspensionCase;
    const bridge = [
      { cause: 'rule-to-method', units: -1 },
      { cause: 'pollution', units: 3 },
      { cause: 'altitude', units: 0 },
    ] as const;
    const ruleOfThumb = { ...evaluation.ruleOfThumb, bridge: [...bridge] };
    const sheet = layOutSheet(draftContent({ ...suspensionCase, evaluation: { ...evaluation, ruleOfThumb } }));
    const words = flat(sheet.elements)
      .map(({ marks }) => wordsOf(marks))
      .join('|');
    expect(words).toMatch(/Rule, 15 kV a disc.*15.*Rule to method.*−1.*14.*Pollution.*\+3.*17.*Specified.*17/);
    expect(words).toContain('never the count');
  });

  it('carries the mechanical loads by case, with the class they need', () => {
    const input: SpecificationInput = {
      ...suspensionCase.input,
      mechanical: {
        basis: 'rd-223',
        subconductors: 2,
        crossing: true,
        acceptedStatistically: false,
        windSpanM: 400,
        weightSpanM: 480,
        lineAngleDeg: 0,
        cases: [
          {
            name: 'Wind at -5 degrees',
            kind: 'wind',
            conductorWeightNPerM: 14.2,
            windPressurePa: 600,
            conductorDiameterMm: 28,
            conductorTensionN: 30000,
            stringWindN: 300,
            stringWeightN: 1200,
            hardwareWeightN: 400,
          },
        ],
      },
    };
    const loads = {
      name: 'Wind at -5 degrees',
      kind: 'wind' as const,
      verticalN: 15232,
      horizontalN: 13740,
      loadPerStringN: 20513,
      loadOneStringMissingN: null,
      factorRequired: 3.75,
      factorProvided: 7.8,
      slackLeg: false,
      verdict: 'met' as const,
    };
    const mechanical = {
      cases: [loads],
      governedBy: loads.name,
      strengthRequiredKn: 76.92,
      classRequiredKn: 80,
      coupling: '16',
    };
    const evaluation = { ...suspensionCase.evaluation, mechanical };
    const sheet = layOutSheet(draftContent({ ...suspensionCase, input, evaluation }));
    const words = flat(sheet.elements)
      .map(({ marks }) => wordsOf(marks))
      .join('|');
    for (const part of [
      'RD 223/2008',
      'Wind span',
      '400 m',
      '20.6 kN',
      '3.75',
      '7.80',
      '77.0 kN',
      '80 kN',
      'coupling 16',
    ])
      expect(words).toContain(part);
  });

  it('says on paper what the content says', async () => {
    const { bytes, pages } = await renderSheet(draftContent(suspensionCase));
    const text = pagesOf(bytes).join('');
    for (const words of [
      '17 units G160-S',
      'Pollution governs.',
      'INS-221-003',
      '6,125 mm',
      '17 × 170 = 2,890',
      'phase to earth',
      'for checking, not for ordering',
      'ceil(6124.82/370)',
      'σ = 0.03',
      '≤',
      '√3',
      `page ${pages} of ${pages}`,
      'Draft: not for ordering',
    ])
      expect(text).toContain(words);
  });
});
