import { describe, expect, it } from 'vitest';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import { decimal, optionalDecimal } from './fields';
import { daysFault, isTimeZone } from './meet';
import { ownPath } from './own-path';
import { basisExample, nextSettings } from './plan';
import { proofOutcome } from './proof';
import { plainCode } from './set-up';
import { slugOf } from './slug';
import { leavesAnOwner, loginSchema } from './staff';

describe('ownPath', () => {
  it.each(['/desk', '/bench/1?a=b', '/'])('goes on to %s', (path) => {
    expect(ownPath(path)).toBe(path);
  });
  it.each([
    '//elsewhere.example',
    '/\\elsewhere.example',
    '\\\\elsewhere.example',
    'https://elsewhere.example/desk',
    'javascript:alert(1)',
    'desk',
    '/desk\nSet-Cookie: a=b',
    '/\t/elsewhere.example',
    '',
    null,
    `/${'x'.repeat(600)}`,
  ])('goes nowhere for %j', (path) => {
    expect(ownPath(path)).toBeNull();
  });
  it('drops what is behind a hash', () => {
    expect(ownPath('/desk#there')).toBe('/desk');
  });
});

describe('slugOf', () => {
  it.each([
    ['Quillmoor Autumn Meet', 'quillmoor-autumn-meet'],
    ['  Zürich – Été!  ', 'zurich-ete'],
    ['東京', 'meet'],
    ['a'.repeat(80), 'a'.repeat(40)],
  ])('makes an address word of %j', (name, slug) => {
    expect(slugOf(name)).toBe(slug);
  });
  it('counts on until it is free', () => {
    expect(slugOf('Meet', ['meet', 'meet-2'])).toBe('meet-3');
  });
});

describe('isTimeZone', () => {
  it.each(['Europe/London', 'UTC', 'America/Argentina/Buenos_Aires'])('knows %s', (name) => {
    expect(isTimeZone(name)).toBe(true);
  });
  it.each(['+01:00', 'Mars/Olympus', '', 'Europe/London; drop table'])(
    'does not know %j',
    (name) => {
      expect(isTimeZone(name)).toBe(false);
    },
  );
});

describe('daysFault', () => {
  it('allows one day and sixty, and no more', () => {
    expect(daysFault({ startsOn: '2026-06-12', endsOn: '2026-06-12' })).toBeNull();
    expect(daysFault({ startsOn: '2026-06-01', endsOn: '2026-07-30' })).toBeNull();
    expect(daysFault({ startsOn: '2026-06-01', endsOn: '2026-07-31' })).toContain('60 days');
  });
});

describe('numbers as they are typed', () => {
  const schema = decimal('The load', { above: 0, max: 1000 });
  it.each([
    ['12,5', 12.5],
    [' 12.5 ', 12.5],
    [12.5, 12.5],
  ])('reads %j', (typed, number) => {
    expect(schema.parse(typed)).toBe(number);
  });
  it.each([
    ['', 'The load is missing.'],
    ['ten', 'The load must be a number.'],
    ['1e9', 'The load must be a number.'],
    ['1,000.5', 'The load must be a number.'],
    [Number.NaN, 'missing'],
    ['0', 'The load must be above zero.'],
    ['-1', 'The load must be above zero.'],
    ['1001', 'The load must not be above 1000.'],
    [null, 'missing'],
  ])('refuses %j', (typed, words) => {
    expect(schema.safeParse(typed).error?.issues[0]?.message).toContain(words);
  });
  it('leaves an optional one out', () => {
    const optional = optionalDecimal('The height', { min: -450 });
    for (const nothing of ['', null, undefined]) expect(optional.parse(nothing)).toBeNull();
    expect(optional.parse('-10')).toBe(-10);
    expect(optional.safeParse('-500').success).toBe(false);
  });
});

describe('proofOutcome', () => {
  it('passes on the limit itself and fails just beyond it, either way', () => {
    for (const reading of [100.5, 99.5]) {
      expect(proofOutcome({ load: 100, reading, limitPercent: 0.5 }).result).toBe('passed');
    }
    // 200.8 against 200 is 0.4 %, and no double is exactly that.
    expect(proofOutcome({ load: 200, reading: 200.8, limitPercent: 0.4 }).result).toBe('passed');
    for (const reading of [100.51, 99.49]) {
      expect(proofOutcome({ load: 100, reading, limitPercent: 0.5 }).result).toBe('failed');
    }
  });
  it('doubts a reading that is far from its load', () => {
    expect(proofOutcome({ load: 100, reading: 1000, limitPercent: 1 })).toMatchObject({
      errorPercent: 900,
      farOff: true,
    });
    expect(proofOutcome({ load: 100, reading: 119, limitPercent: 1 }).farOff).toBe(false);
  });
  it.each([
    { load: 0, reading: 1, limitPercent: 1 },
    { load: Number.NaN, reading: 1, limitPercent: 1 },
    { load: 1, reading: -1, limitPercent: 1 },
    { load: 1, reading: 1, limitPercent: 0 },
  ])('throws for %j', (input) => {
    expect(() => proofOutcome(input)).toThrow(RangeError);
  });
});

describe('the plan of a meet', () => {
  it('shows a tool that is inside on one basis and beyond on the other', () => {
    const { deviations, inside } = basisExample();
    expect(deviations.reference).toBeCloseTo(-3.9385, 4);
    expect(deviations.set).toBeCloseTo(4.1, 10);
    expect(inside).toEqual({ reference: true, set: false });
  });
  it('raises its version only when something is different', () => {
    const { version, scheme, basis, guard, overrides } = DEFAULT_PLAN_SETTINGS;
    const same = { scheme, basis, guard, ...overrides };
    expect(nextSettings(DEFAULT_PLAN_SETTINGS, same)).toBe(DEFAULT_PLAN_SETTINGS);
    expect(nextSettings(DEFAULT_PLAN_SETTINGS, { ...same, exercisePulls: 0 })).toMatchObject({
      version: version + 1,
      overrides: { exercisePulls: 0, readingsPerPoint: null },
    });
  });
});

describe('the staff', () => {
  it('needs one owner who can sign in', () => {
    const people = [
      { id: 'a', role: 'owner' as const, active: true },
      { id: 'b', role: 'owner' as const, active: false },
      { id: 'c', role: 'lead' as const, active: true },
    ];
    expect(leavesAnOwner(people, { id: 'a', role: 'owner', active: false })).toBe(false);
    expect(leavesAnOwner(people, { id: 'a', role: 'lead', active: true })).toBe(false);
    expect(leavesAnOwner(people, { id: 'c', role: 'operator', active: false })).toBe(true);
  });
  it('signs in whatever the case', () => {
    expect(loginSchema.parse(' Ada.Fell ')).toBe('ada.fell');
    expect(loginSchema.safeParse('ada fell').success).toBe(false);
  });
  it('compares set-up codes without hyphens and case', () => {
    expect(plainCode(' abcd-ef34 ')).toBe('ABCDEF34');
  });
});
