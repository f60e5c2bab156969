import { changesBetween, sameValue, valueAt, withValueAt } from './values';

describe('values by path', () => {
  it('reads and sets without touching the root', () => {
    const root = { a: { b: 1 }, c: 2 };
    expect(valueAt(root, 'a.b')).toBe(1);
    expect(valueAt(root, 'a.b.x')).toBeUndefined();
    expect(withValueAt(root, 'a.d.e', 5)).toEqual({ a: { b: 1, d: { e: 5 } }, c: 2 });
    expect(root).toEqual({ a: { b: 1 }, c: 2 });
  });

  it('takes every kind of blank as the same', () => {
    expect(sameValue({ a: null, b: {} }, undefined)).toBe(true);
    expect(sameValue({ a: 1, b: null }, { a: 1 })).toBe(true);
    expect(sameValue({ a: 0 }, {})).toBe(false);
    expect(sameValue({ a: '' }, {})).toBe(false);
    expect(sameValue([1, 2], [2, 1])).toBe(false);
  });

  it('lists changes leaf by leaf', () => {
    expect(
      changesBetween({ a: { b: 1, c: 2 }, l: [{ x: 1 }] }, { a: { b: 3, c: 2 }, l: [{ x: 1 }, { x: 2 }] }),
    ).toEqual({
      'a.b': { from: 1, to: 3 },
      'l.1.x': { from: null, to: 2 },
    });
    expect(changesBetween({ a: null }, { a: { b: { c: 1 } } })).toEqual({ 'a.b.c': { from: null, to: 1 } });
    expect(changesBetween({ a: 1 }, { a: { b: 2 } })).toEqual({ a: { from: 1, to: { b: 2 } } });
    expect(changesBetween({ a: 1, b: undefined }, { a: 1, b: null })).toEqual({});
  });
});
