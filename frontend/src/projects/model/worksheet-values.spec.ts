import { contract } from '@bellgap/common/api';
import { worksheetInputSchema, WORKSHEET_FIELDS } from '@bellgap/common/schemas';
import { aWorksheet } from '@bellgap/common/testing';
import { aDesignBasis } from '../../testing/builders';
import { basisChanges } from './basis-rows';
import { WORKSHEET_GROUPS } from './worksheet-groups';
import { isBlankWorksheet, worksheetBody, worksheetValues } from './worksheet-values';

describe('the form of a worksheet', () => {
  it('offers every input once, and each place by itself', () => {
    const offered = WORKSHEET_GROUPS.flatMap(({ paths }) => paths);
    expect(new Set(offered).size).toBe(offered.length);
    const fields = new Set(offered.map((path) => path.replace(/\[\d\]/, '')));
    // The highest voltage is that of the basis, a place is named by its group.
    expect(Object.keys(WORKSHEET_FIELDS).filter((path) => !fields.has(path))).toEqual([
      'highestVoltageKv',
      'places.place',
    ]);
  });

  it('gives back what was stored', () => {
    const stored = aWorksheet();
    const body = worksheetBody(worksheetValues(stored), 245);
    expect(contract.insulationLevelWorksheet.body.isValidSync(body, { strict: true })).toBe(true);
    const { places, ...rest } = body!;
    expect(rest).toEqual({ ...stored, places: undefined });
    expect(places).toEqual([...stored.places!].reverse().map((place) => expect.objectContaining(place) as unknown));
  });

  it('is no worksheet where nothing is filled in', () => {
    expect(isBlankWorksheet(worksheetValues(null))).toBe(true);
    expect(worksheetBody(worksheetValues(null), 245)).toBeNull();
  });

  it('leaves out arresters, lines and a line entrance that are not described', () => {
    const values = worksheetValues(
      aWorksheet({ arrester: null, fastFront: null, places: aWorksheet().places!.slice(1) }),
    );
    const body = worksheetBody(values, 245);
    expect(body).toMatchObject({ arrester: null, fastFront: null, places: [{ place: 'other-equipment' }] });
    expect(body?.places).toHaveLength(1);
    const typed = { ...values, places: values.places.map((place) => ({ ...place, slowFrontPhaseToEarthPu: 'two' })) };
    expect(worksheetInputSchema.isValidSync(worksheetBody(typed, 245), { strict: true })).toBe(false);
  });
});

describe('what a revision changed', () => {
  it('names the worksheet when it comes, and its figures after that', () => {
    const without = aDesignBasis({ worksheet: null });
    const first = aDesignBasis({ worksheet: aWorksheet() });
    const next = aDesignBasis({ worksheet: aWorksheet({ altitudeM: 2310 }) });
    expect(basisChanges(without, first)).toEqual([{ label: 'Insulation level worksheet', from: 'none', to: 'kept' }]);
    expect(basisChanges(first, next)).toEqual([{ label: 'Worksheet, site: altitude', from: '1000 m', to: '2310 m' }]);
  });
});
