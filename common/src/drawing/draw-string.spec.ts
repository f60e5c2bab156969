import fc from 'fast-check';
import type { InsulatorUnit } from '../engine/model';
import { answer, discUnit, drawingCases, lineInput, postUnit, suspensionCase } from './fixtures';
import { allWords, boxesOverlap, drawString, outlineOf, textBox, type Drawing, type Primitive } from './index';

const drawn = (drawing: Drawing | null): Drawing => {
  if (!drawing) throw new Error('nothing was drawn');
  return drawing;
};

function numbersOf(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (Array.isArray(value)) return value.flatMap(numbersOf);
  if (value !== null && typeof value === 'object') return Object.values(value).flatMap(numbersOf);
  return [];
}

const coordinates = (primitive: Primitive): number[] =>
  primitive.kind === 'path' ? (primitive.data.match(/-?\d+(\.\d+)?/g) ?? []).map(Number) : numbersOf(primitive);

function overlaps(drawing: Drawing): string[] {
  const words = allWords(drawing);
  const boxes = words.map((w) => textBox(w, drawing.textHeightMm));
  const found: string[] = [];
  words.forEach((word, i) =>
    words.slice(i + 1).forEach((other, j) => {
      if (boxesOverlap(boxes[i]!, boxes[i + 1 + j]!)) found.push(`${word.text} | ${other.text}`);
    }),
  );
  return found;
}

function outside(drawing: Drawing): string[] {
  return allWords(drawing)
    .filter((w) =>
      textBox(w, drawing.textHeightMm).some(
        (p) => p.xMm < 0 || p.yMm < 0 || p.xMm > drawing.widthMm || p.yMm > drawing.heightMm,
      ),
    )
    .map((w) => w.text);
}

const heights = (data: string): [number, number] => {
  const ys = [...data.matchAll(/-?[\d.]+ (-?[\d.]+)/g)].map((m) => Number(m[1]));
  return [Math.min(...ys), Math.max(...ys)];
};

/** Rise and run of a dimension, for an angle above the horizontal. */
const directionOf = ({ from, to }: { from: { xMm: number; yMm: number }; to: { xMm: number; yMm: number } }) =>
  [from.yMm - to.yMm, to.xMm - from.xMm] as const;

describe('the string to scale', () => {
  const discs = (drawing: Drawing) =>
    drawing.primitives.flatMap((p) => (p.kind === 'path' && p.about === 'string.units' ? [p.data] : []));

  it('draws each disc once, one spacing below the other', () => {
    const shells = discs(drawn(drawString(suspensionCase.input, suspensionCase.context, suspensionCase.evaluation)));
    expect(shells).toHaveLength(17);
    const tops = shells.map((data) => heights(data)[0]);
    for (let i = 1; i < tops.length; i += 1) expect(tops[i]! - tops[i - 1]!).toBeCloseTo(170, 1);
  });

  it('draws the real diameter and the section length of n spacings', () => {
    const drawing = drawn(drawString(suspensionCase.input, suspensionCase.context, suspensionCase.evaluation));
    const xs = [...discs(drawing)[0]!.matchAll(/(-?[\d.]+) -?[\d.]+/g)].map((m) => Number(m[1]));
    expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(280, 1);
    const section = drawing.primitives.find((p) => p.about === 'string.sectionLengthMm');
    expect(section?.kind).toBe('dimension');
    if (section?.kind === 'dimension') {
      expect(section.to.yMm - section.from.yMm).toBeCloseTo(17 * 170, 6);
      expect(section.text).toBe('17 × 170 = 2,890');
    }
  });

  it('draws the clearance from the surface of the live part', () => {
    const drawing = drawn(drawString(suspensionCase.input, suspensionCase.context, suspensionCase.evaluation));
    const arc = drawing.primitives.find((p) => p.kind === 'arc' && p.layer === 'clearance');
    const clamp = drawing.primitives.find((p) => p.kind === 'circle' && p.layer === 'live');
    expect(arc?.kind === 'arc' && clamp?.kind === 'circle' && arc.radiusMm - clamp.radiusMm).toBeCloseTo(1900, 6);
  });

  it('lays a tension string level', () => {
    const tension = drawingCases.find((c) => c.input.string?.arrangement === 'tension')!;
    const drawing = drawn(drawString(tension.input, tension.context, tension.evaluation));
    const section = drawing.primitives.find((p) => p.about === 'string.sectionLengthMm');
    if (section?.kind !== 'dimension') throw new Error('no section length');
    expect(section.to.xMm - section.from.xMm).toBeCloseTo(18 * 170, 6);
    expect(section.to.yMm).toBeCloseTo(section.from.yMm, 6);
    expect(discs(drawing)).toHaveLength(36);
    expect(allWords(drawing).map((w) => w.text)).toContain('1 extra');
  });

  it('turns the legs of a V by their angles', () => {
    const v = drawingCases.find((c) => c.input.string?.arrangement === 'v-suspension')!;
    const drawing = drawn(drawString(v.input, v.context, v.evaluation));
    const section = drawing.primitives.find((p) => p.about === 'string.sectionLengthMm');
    if (section?.kind !== 'dimension') throw new Error('no section length');
    const dx = section.to.xMm - section.from.xMm;
    const dy = section.to.yMm - section.from.yMm;
    expect(Math.hypot(dx, dy)).toBeCloseTo(2890, 6);
    expect((Math.atan2(dx, dy) * 180) / Math.PI).toBeCloseTo(50, 6);
    expect(discs(drawing)).toHaveLength(34);
  });

  describe('a line post', () => {
    const postAt = (postAngleDeg: number | null, chosen: Parameters<typeof lineInput>[0] = {}): Drawing => {
      const unit = postUnit();
      const evaluation = answer(unit, 1, { stringLengthWithFittingsMinMm: null, stringLengthWithFittingsMaxMm: null });
      const input = lineInput({ postAngleDeg, hardwareLengthMm: 200, ...chosen });
      return drawn(drawString(input, { insulator: unit }, evaluation));
    };
    const sectionOf = (drawing: Drawing) => {
      const section = drawing.primitives.find((p) => p.about === 'string.sectionLengthMm');
      if (section?.kind !== 'dimension') throw new Error('no section length');
      return section;
    };
    const words = (drawing: Drawing) => allWords(drawing).map((w) => w.text);

    it.each([0, 15, 30, 45, 60, 90])('leans %i degrees out of its structure, true to length', (postAngleDeg) => {
      const drawing = postAt(postAngleDeg);
      const { from, to, text } = sectionOf(drawing);
      const [dx, dy] = [to.xMm - from.xMm, to.yMm - from.yMm];
      expect(Math.hypot(dx, dy)).toBeCloseTo(960, 6);
      expect((Math.atan2(-dy, dx) * 180) / Math.PI).toBeCloseTo(postAngleDeg, 6);
      expect(text).toBe('960');
      expect(words(drawing)).toContain(`${postAngleDeg}° above the horizontal`);
      expect(discs(drawing)).toHaveLength(1);
    });

    it('has its conductor at the tip, one length of fittings and post away from the structure', () => {
      const drawing = postAt(0);
      const steel = drawing.primitives.find((p) => p.kind === 'path' && p.layer === 'structure');
      const clamp = drawing.primitives.find((p) => p.kind === 'circle' && p.layer === 'live');
      if (steel?.kind !== 'path' || clamp?.kind !== 'circle') throw new Error('no structure or no conductor');
      const faceMm = Math.max(...[...steel.data.matchAll(/(-?[\d.]+) -?[\d.]+/g)].map((m) => Number(m[1])));
      expect(clamp.centre.xMm - faceMm).toBeCloseTo(960 + 200, 1);
      expect(clamp.centre.yMm).toBeCloseTo((heights(discs(drawing)[0]!)[0] + heights(discs(drawing)[0]!)[1]) / 2, 1);
      const arc = drawing.primitives.find((p) => p.kind === 'arc' && p.layer === 'clearance');
      expect(arc?.kind === 'arc' && arc.radiusMm - clamp.radiusMm).toBeCloseTo(1900, 6);
      expect(arc?.kind === 'arc' && arc.centre).toEqual(clamp.centre);
    });

    it('is named a post, and never hangs or is pulled', () => {
      const drawing = postAt(20, { arrangement: 'tension' });
      expect(drawing.title).toBe('Line post, LP10-66, to scale');
      expect(drawing.description).toContain(
        'fixed at the structure, axis 20° above the horizontal, conductor at the tip',
      );
      expect((Math.atan2(...directionOf(sectionOf(drawing))) * 180) / Math.PI).toBeCloseTo(20, 6);
    });

    it('says that its angle was not given', () => {
      expect(words(postAt(null))).toContain('angle of the post not given, 0° drawn');
    });

    it('keeps its words apart at every angle', () => {
      for (let postAngleDeg = 0; postAngleDeg <= 90; postAngleDeg += 5) {
        for (const spacingMm of [400, 960, 2200]) {
          for (const arcingDevices of ['none', 'horns'] as const) {
            const unit = postUnit({ spacingMm, diameterMm: 0.16 * spacingMm });
            const input = lineInput({ postAngleDeg, arcingDevices, arcGapMm: 0.8 * spacingMm });
            const drawing = drawn(drawString(input, { insulator: unit }, answer(unit, 1)));
            const found = { postAngleDeg, spacingMm, arcingDevices, overlaps: overlaps(drawing) };
            expect(found).toEqual({ ...found, overlaps: [] });
          }
        }
      }
    });
  });

  it('draws the share of the voltage as a bar beside each disc, the line end solid', () => {
    const lineEndFirst = [40, 25, 20, 15];
    const evaluation = answer(discUnit(), 4, { voltageSharing: lineEndFirst });
    const drawing = drawn(drawString(suspensionCase.input, suspensionCase.context, evaluation));
    const bars = drawing.primitives.flatMap((p) => (p.kind === 'path' && p.layer === 'share' ? [p] : []));
    const widths = bars
      .flatMap(({ data }) => data.split('Z').filter((one) => one !== ''))
      .map((one) => {
        const xs = [...one.matchAll(/(-?[\d.]+) -?[\d.]+/g)].map((m) => Number(m[1]));
        return Math.max(...xs) - Math.min(...xs);
      });
    expect(widths).toHaveLength(4);
    widths.forEach((width, i) => expect(width / widths[3]!).toBeCloseTo([15, 20, 25, 40][i]! / 40, 2));
    expect(bars.map(({ solid }) => solid ?? false)).toEqual([false, true]);
    const words = allWords(drawing).map((w) => w.text);
    expect(words).toEqual(expect.arrayContaining(['15.0 % voltage share', '40.0 %']));
    expect(drawing.description).toContain('from 15.0 % at the attachment to 40.0 % at the line end');
  });

  it.each([
    ['a count that is not that of the shares', { voltageSharing: [60, 40] }],
    ['no shares', { voltageSharing: [] }],
  ])('draws no bars for %s', (_, over) => {
    const drawing = drawn(drawString(suspensionCase.input, suspensionCase.context, answer(discUnit(), 4, over)));
    expect(drawing.primitives.some(({ layer }) => layer === 'share')).toBe(false);
  });

  it('draws nothing without a unit or a count', () => {
    expect(drawString(suspensionCase.input, { insulator: null }, suspensionCase.evaluation)).toBeNull();
    expect(
      drawString(suspensionCase.input, suspensionCase.context, answer(discUnit(), 17, { units: null })),
    ).toBeNull();
    expect(
      drawString(suspensionCase.input, suspensionCase.context, { ...suspensionCase.evaluation, string: null }),
    ).toBeNull();
  });

  it.each(drawingCases)('keeps its words apart and inside: $name', ({ input, context, evaluation }) => {
    for (const textScale of [1, 1.35]) {
      const drawing = drawn(drawString(input, context, evaluation, { textScale }));
      expect(overlaps(drawing)).toEqual([]);
      expect(outside(drawing)).toEqual([]);
    }
  });

  it.each([1, 2, 3, 5, 8, 12, 17, 24, 32, 40])('keeps its words apart for %i discs', (units) => {
    for (const spacingMm of [110, 127, 146, 170, 195, 240]) {
      const unit = discUnit({ spacingMm, diameterMm: Math.round(1.7 * spacingMm) });
      for (const arrangement of ['suspension', 'tension', 'v-suspension'] as const) {
        const drawing = drawn(
          drawString(
            lineInput({ arrangement }),
            { insulator: unit },
            answer(unit, units, { extraUnits: Math.min(2, units) }),
          ),
        );
        expect({ spacingMm, arrangement, overlaps: overlaps(drawing) }).toEqual({
          spacingMm,
          arrangement,
          overlaps: [],
        });
      }
    }
  });

  it('stays finite and whole for any answer', () => {
    const unit: fc.Arbitrary<InsulatorUnit> = fc
      .record({
        kind: fc.constantFrom(
          'cap-and-pin' as const,
          'ceramic-rod' as const,
          'composite-rod' as const,
          'line-post' as const,
        ),
        profile: fc.constantFrom(
          'standard' as const,
          'fog' as const,
          'open' as const,
          'alternating' as const,
          'unknown' as const,
        ),
        spacingMm: fc.double({ min: 50, max: 8000, noNaN: true }),
        diameterMm: fc.option(fc.double({ min: 20, max: 600, noNaN: true })),
        dryArcMm: fc.option(fc.double({ min: 1, max: 9000, noNaN: true })),
      })
      .map((over) => discUnit(over));
    const chosen = fc.record({
      arrangement: fc.constantFrom('suspension' as const, 'v-suspension' as const, 'tension' as const, null),
      surroundings: fc.constantFrom(
        'cross-arm' as const,
        'window' as const,
        'lower-structure' as const,
        'open' as const,
        null,
      ),
      arcingDevices: fc.constantFrom('none' as const, 'horns' as const, 'rings' as const, null),
      arcGapMm: fc.option(fc.double({ min: 1, max: 9000, noNaN: true })),
      hardwareLengthMm: fc.option(fc.double({ min: 0, max: 3000, noNaN: true })),
      parallelStrings: fc.option(fc.integer({ min: 1, max: 4 })),
      vAngleWindwardDeg: fc.option(fc.double({ min: 1, max: 89, noNaN: true })),
      vAngleLeewardDeg: fc.option(fc.double({ min: 1, max: 89, noNaN: true })),
      postAngleDeg: fc.option(fc.double({ min: 0, max: 90, noNaN: true })),
    });
    const result = fc.record({
      units: fc.option(fc.integer({ min: 1, max: 60 })),
      extraUnits: fc.option(fc.integer({ min: 0, max: 20 })),
      stringLengthWithFittingsMinMm: fc.option(fc.double({ min: 1, max: 20000, noNaN: true })),
    });
    const clearance = fc.option(fc.double({ min: 10, max: 15000, noNaN: true }));
    fc.assert(
      fc.property(unit, chosen, result, clearance, (insulator, string, over, phaseToEarthMm) => {
        const base = answer(insulator, over.units ?? 1, over);
        const evaluation = { ...base, clearances: base.clearances && { ...base.clearances, phaseToEarthMm } };
        const drawing = drawString(lineInput(string), { insulator }, evaluation);
        if (!drawing) return insulator.kind === 'cap-and-pin' ? over.units === null : (over.units ?? 0) > 20;
        const numbers = [
          drawing.widthMm,
          drawing.heightMm,
          drawing.textHeightMm,
          ...drawing.primitives.flatMap(coordinates),
        ];
        expect(numbers.every(Number.isFinite)).toBe(true);
        const data = drawing.primitives.map((p) => outlineOf(p, drawing.textHeightMm)?.data ?? '').join('');
        expect(data).not.toMatch(/NaN|Infinity|e[+-]/);
        return drawing.widthMm > 0 && drawing.heightMm > 0;
      }),
      { numRuns: 100 },
    );
  });
});
