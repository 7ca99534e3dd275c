import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonical } from './canonical';

describe('canonical', () => {
  it('sorts names, keeps lists in order, leaves out what is undefined', () => {
    expect(canonical({ b: [2, 1], a: undefined, A: { z: null, y: 'ü' } })).toBe(
      '{"A":{"y":"ü","z":null},"b":[2,1]}',
    );
  });
  it('writes infinite degrees of freedom as null, and no other infinity', () => {
    expect(canonical({ dof: Infinity, combined: { effectiveDof: Infinity } })).toBe(
      '{"combined":{"effectiveDof":null},"dof":null}',
    );
    expect(() => canonical({ expanded: Infinity })).toThrow(/The record.expanded is Infinity/);
    expect(() => canonical({ dof: -Infinity })).toThrow(RangeError);
    expect(() => canonical({ dof: Number.NaN })).toThrow(RangeError);
    expect(() => canonical({ dof: [Infinity] })).toThrow(RangeError);
    expect(() => canonical({ a: [{ b: Number.NaN }] })).toThrow(/The record.a\[0\].b is NaN/);
  });
  it('refuses what is no JSON', () => {
    for (const value of [undefined, () => 1, Symbol('x'), 1n, new Date(0), new Map()]) {
      expect(() => canonical(value)).toThrow(TypeError);
      expect(() => canonical([value])).toThrow(TypeError);
    }
    expect(() => canonical('\ud83d')).toThrow(RangeError);
    expect(() => canonical({ '\ude00': 1 })).toThrow(RangeError);
  });
  it('is the same whatever order the names came in, and reads back as it was', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        const text = canonical(value);
        expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(value)));
        expect(canonical(JSON.parse(text))).toBe(text);
      }),
    );
    fc.assert(
      fc.property(fc.dictionary(fc.string({ unit: 'grapheme' }), fc.integer()), (value) => {
        const turned = Object.fromEntries(Object.entries(value).reverse());
        expect(canonical(turned)).toBe(canonical(value));
      }),
    );
  });
});
