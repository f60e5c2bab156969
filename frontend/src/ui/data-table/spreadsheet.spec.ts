import { searchRows, sortRows, type Column } from './columns';
import { toCsv, toTsv } from './spreadsheet';

interface Row {
  code: string;
  note: string | null;
  creepageMm: number | null;
}

const columns: Column<Row>[] = [
  { key: 'code', title: 'Code', value: (row) => row.code },
  { key: 'note', title: 'Note', value: (row) => row.note },
  { key: 'creepageMm', title: 'Creepage, mm', value: (row) => row.creepageMm, figure: true },
  { key: 'act', title: 'Act', value: () => 'x', screenOnly: true },
];
const rows: Row[] = [
  { code: 'U160BL', note: 'say "fog", please', creepageMm: 445 },
  { code: 'U70BL', note: '=1+1', creepageMm: -0.5 },
  { code: '52-3', note: '-0.02', creepageMm: null },
];

describe('spreadsheet', () => {
  it('writes figures as figures, quotes what needs it and marks text that would be a formula', () => {
    expect(toCsv(rows, columns)).toBe(
      '\uFEFFCode,Note,"Creepage, mm"\r\nU160BL,"say ""fog"", please",445\r\nU70BL,\'=1+1,-0.5\r\n52-3,-0.02,\r\n',
    );
  });

  it('puts tabs between the cells of a copy and none inside them', () => {
    expect(toTsv([{ code: 'A\tB', note: 'two\nlines', creepageMm: 1 }], columns)).toBe(
      'Code\tNote\tCreepage, mm\nA B\ttwo lines\t1',
    );
  });

  it('sorts codes as people count and leaves missing figures last', () => {
    expect(sortRows(rows, columns, 'code').map(({ code }) => code)).toEqual(['52-3', 'U70BL', 'U160BL']);
    expect(sortRows(rows, columns, '-creepageMm').map(({ code }) => code)).toEqual(['U160BL', 'U70BL', '52-3']);
  });

  it('finds rows that hold every word', () => {
    expect(searchRows(rows, columns, 'fog u160').map(({ code }) => code)).toEqual(['U160BL']);
  });
});
