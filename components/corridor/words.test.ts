import { describe, expect, it } from 'vitest';
import type { CorridorRow } from './types';
import { corridorDescription, signedPercent } from './words';

describe('signedPercent', () => {
  it.each([
    [4, undefined, '+4\u00a0%'],
    [-3.846, undefined, '\u22123.85\u00a0%'],
    [-2, 1, '\u22122.0\u00a0%'],
    [0, undefined, '0\u00a0%'],
    [-0.04, 1, '0.0\u00a0%'],
  ])('%d with %s digits is %s', (value, digits, text) => {
    expect(signedPercent(value, digits)).toBe(text);
  });
});

describe('corridorDescription', () => {
  const row: CorridorRow = {
    label: '60',
    unitLabel: 'N·m',
    direction: 'ccw',
    lower: -4,
    upper: 4,
    guardPercent: 0.5,
    readings: [{ deviation: -2.04, beyond: false }],
    mean: -2.04,
    meanExpanded: null,
    words: 'delivers 2.0 % low',
    excluded: true,
  };

  it('says the row in words', () => {
    expect(corridorDescription([row], 'set')).toBe(
      '60 N·m counter-clockwise: 1 reading at \u22122.0\u00a0%, mean \u22122.0\u00a0%, ' +
        'delivers 2.0 % low, none beyond the limits of \u22124\u00a0% and +4\u00a0%, ' +
        'not counted. A positive deviation means that the tool delivers more than it says.',
    );
  });

  it('says which way the sign goes on the reference basis', () => {
    expect(corridorDescription([], 'reference')).toContain('delivers less than it says');
  });
});
