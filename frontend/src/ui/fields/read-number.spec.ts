import { decimalSignOf, editedText } from './decimal-sign';
import { readNumber } from './read-number';

const point = (text: string, unit?: string) => readNumber(text, { sign: '.', unit });
const comma = (text: string, unit?: string) => readNumber(text, { sign: ',', unit });
const number = (value: number) => ({ kind: 'number', value });

describe('decimal sign', () => {
  it.each([
    ['en-GB', '.'],
    ['de-DE', ','],
    ['es-ES', ','],
  ])('of %s is %s', (locale, sign) => expect(decimalSignOf(locale)).toBe(sign));

  it('writes every digit of a stored figure with it', () => {
    expect(editedText(2.225, ',')).toBe('2,225');
    expect(editedText(1420.0632, '.')).toBe('1420.0632');
    expect(editedText(null, '.')).toBe('');
  });
});

describe('reading a number', () => {
  it.each(['12,4', '12.4'])('reads %s under either sign', (text) => {
    expect(point(text)).toEqual(number(12.4));
    expect(comma(text)).toEqual(number(12.4));
  });

  it.each([
    ['2.225', 2.225],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1,234,567', 1234567],
    ['1 234 567', 1234567],
    ['1\u202f234.5', 1234.5],
    ['0,125', 0.125],
    ['-0.02', -0.02],
    ['−430', -430],
    ['12.', 12],
    ['.5', 0.5],
  ])('reads %s', (text, value) => expect(point(text)).toEqual(number(value)));

  it('takes the sign of the locale as decimal sign and refuses what the other sign leaves open', () => {
    expect(comma('2,225')).toEqual(number(2.225));
    expect(point('1,234')).toMatchObject({ kind: 'unreadable', message: expect.stringContaining('1234 or 1.234') });
    expect(comma('1.234')).toMatchObject({ kind: 'unreadable', message: expect.stringContaining('1234 or 1,234') });
  });

  it.each(['abc', '12,,4', '1.2.3', '12 4', '-', '1,23,456.7', '--3'])('refuses %s in words', (text) => {
    expect(point(text)).toMatchObject({ kind: 'unreadable', message: expect.stringMatching(/cannot be read/) });
  });

  it('tells nothing from blank', () => expect(point('  ')).toEqual({ kind: 'empty' }));
});

describe('units typed behind a number', () => {
  it.each(['900 m', '900m', '900 M'])('reads %s in a metre field', (text) => {
    expect(point(text, 'm')).toEqual(number(900));
  });

  it('offers feet in a metre field as a conversion, in full digits', () => {
    expect(point('4659 ft', 'm')).toEqual({
      kind: 'conversion',
      typed: 4659,
      typedUnit: 'ft',
      value: 1420.0632,
      unit: 'm',
    });
    expect(point("4659'", 'm')).toMatchObject({ kind: 'conversion', value: 1420.0632 });
    expect(point('57.5 in', 'mm')).toMatchObject({ kind: 'conversion', value: 1460.5 });
    expect(point('1.2 km', 'm')).toMatchObject({ kind: 'conversion', value: 1200 });
  });

  it('refuses a unit of another kind and an unknown one', () => {
    expect(point('900 kV', 'm')).toMatchObject({ kind: 'unreadable', message: 'This field is in m, not in kV' });
    expect(point('900 furlongs', 'm')).toMatchObject({ kind: 'unreadable' });
    expect(point('2 m')).toMatchObject({ kind: 'unreadable' });
  });

  it('takes plain kV in a kV field, never peak for r.m.s.', () => {
    expect(point('245 kV', 'kV rms')).toEqual(number(245));
    expect(point('1050 kV peak', 'kV peak')).toEqual(number(1050));
    expect(point('1050 kV peak', 'kV rms')).toMatchObject({ kind: 'unreadable' });
    expect(point('132000 V', 'kV rms')).toMatchObject({ kind: 'conversion', value: 132 });
  });
});
