import { describe, expect, it } from 'vitest';
import { joinSchema, parseDecimal, parseNumbers } from './join';

const INPUT = {
  meetId: '01920000-0000-7000-8000-000000000001',
  tool: { toolClass: 'II-A', rangeMin: 40, rangeMax: 200, unit: 'N.m' },
  consent: 'maximum',
  visitor: {},
} as const;

const complaints = (input: unknown): string[] =>
  joinSchema
    .safeParse(input)
    .error?.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`) ?? [];

describe('joinSchema', () => {
  it('takes the short form', () => {
    expect(joinSchema.parse(INPUT)).toMatchObject({ consent: 'maximum', workingPoints: null });
  });

  it.each([
    ['a range upside down', { tool: { ...INPUT.tool, rangeMin: 200, rangeMax: 40 } }, 'swapped'],
    ['no number', { tool: { ...INPUT.tool, rangeMax: Number.NaN } }, 'must be a number'],
    ['a negative value', { tool: { ...INPUT.tool, rangeMin: -4 } }, 'above zero'],
    ['an unknown unit', { tool: { ...INPUT.tool, unit: 'stone' } }, 'Choose the unit'],
    ['a name of 10 kB', { visitor: { name: 'x'.repeat(10_240) } }, 'at most 80 characters'],
    ['a mail address that is none', { visitor: { email: 'me at home' } }, 'mail address'],
    ['working points only, without any', { consent: 'working' }, 'at least one working torque'],
    ['a working point outside the range', { workingPoints: [10] }, '10 lies outside'],
    [
      'a preset wrench without its value',
      { tool: { ...INPUT.tool, toolClass: 'II-B' } },
      'one value',
    ],
  ])('refuses %s, in words', (_, change, words) => {
    expect(complaints({ ...INPUT, ...change }).join('\n')).toContain(words);
  });

  it('takes an empty mail and an empty name as none', () => {
    expect(joinSchema.parse({ ...INPUT, visitor: { name: ' ', email: '' } }).visitor).toEqual({
      name: null,
      email: null,
      mobile: null,
    });
  });
});

describe('parseNumbers', () => {
  it.each([
    ['45, 110', [45, 110]],
    ['45 110', [45, 110]],
    ['45;110', [45, 110]],
    ['4,5 11,25', [4.5, 11.25]],
    ['4,5, 11,25', [4.5, 11.25]],
    ['', []],
  ])('reads %j', (text, numbers) => {
    expect(parseNumbers(text)).toEqual(numbers);
  });

  it('refuses words, and what may be one number or two', () => {
    expect(parseNumbers('45 and 110')).toBeNull();
    expect(parseNumbers('45,110')).toBeNull();
  });
});

describe('parseDecimal', () => {
  it.each([
    ['12,5', 12.5],
    [' 12.5 ', 12.5],
    ['', null],
  ])('reads %j', (text, number) => {
    expect(parseDecimal(text)).toBe(number);
  });

  it.each(['12 Nm', '1e3', '--4', '0x10'])('gives NaN for %j', (text) => {
    expect(parseDecimal(text)).toBeNaN();
  });
});
