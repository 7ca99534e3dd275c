import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createLineParser, parseTesterLine } from './line';
import { DEFAULT_LINE_PATTERN } from './pattern';

const newtonMetres = { pattern: DEFAULT_LINE_PATTERN, unit: 'N.m' } as const;

describe('parseTesterLine with the default pattern', () => {
  it.each([
    ['  +12.34 N.m', 12.34, 'cw'],
    ['-3.2', 3.2, 'ccw'],
    ['− 3.2', 3.2, 'ccw'],
    ['100', 100, null],
    ['.5 Nm', 0.5, null],
    ['0,05 N·m', 0.05, null],
    ['250 cN.m', 2.5, null],
    ['\u000212.5 N m\u0003', 12.5, null],
    // 1 lbf·ft = 1.3558179483314004 N·m, 1 lbf·in a twelfth, by definition of pound and foot.
    ['12,34 lbf.ft', 16.730793482, null],
    ['+100 ft-lb', 135.581794833, 'cw'],
    ['-120 IN-LB', 13.558179483, 'ccw'],
    ['16 ozf in', 0.112984829, null],
    ['10 kgf.cm', 0.980665, null],
    ['2 kgf·m', 19.6133, null],
  ])('reads %j', (line, valueNm, direction) => {
    const parsed = parseTesterLine(line, newtonMetres);
    expect(parsed).toEqual({ ok: true, valueNm: expect.closeTo(valueNm, 8), direction });
  });

  it('takes the unit of the tester when the line names none', () => {
    expect(parseTesterLine('100', { ...newtonMetres, unit: 'lbf.ft' })).toEqual({
      ok: true,
      valueNm: expect.closeTo(135.581794833, 8),
      direction: null,
    });
  });

  it.each([
    ['', 'it does not look like a reading'],
    ['NaN', 'it does not look like a reading'],
    ['12.3.4', 'it holds no number'],
    ['1,234.5', 'it holds no number'],
    ['1e5', 'it does not look like a reading'],
    ['12 12', 'it does not look like a reading'],
    ['+-3', 'it does not look like a reading'],
    ['overload', 'it does not look like a reading'],
    ['12 furlongs', "its unit 'furlongs' is not known"],
    ['1'.repeat(201), 'the line is longer than 200 characters'],
  ])('refuses %j', (line, reason) => {
    const parsed = parseTesterLine(line, newtonMetres);
    expect(parsed.ok).toBe(false);
    if (!parsed.ok) expect(parsed.reason).toBe(reason);
  });
});

describe('parseTesterLine with a pattern of its own', () => {
  it('reads words for the direction and text around the value', () => {
    const pattern = String.raw`PK\s*(?<sign>CW|CCW)\s*(?<value>[\d.,]+);.*`;
    const parse = createLineParser({ pattern, unit: 'N.m' });
    expect(parse('PK CCW 41.5;batt ok')).toEqual({ ok: true, valueNm: 41.5, direction: 'ccw' });
    expect(parse('PK CW 1.2.3;')).toEqual({ ok: false, reason: 'it holds no number' });
    expect(parse('xPK CW 41.5;')).toMatchObject({ ok: false });
  });

  it('takes a sign inside the value, but never two', () => {
    const parse = createLineParser({ pattern: '(?<sign>[+-])?(?<value>[-\\d]+)', unit: 'N.m' });
    expect(parse('-5')).toEqual({ ok: true, valueNm: 5, direction: 'ccw' });
    expect(parse('--5')).toEqual({ ok: false, reason: 'it has two signs' });
  });
});

describe('properties', () => {
  const anyLine = fc.oneof(
    fc.string({ unit: 'binary', maxLength: 250 }),
    fc.stringMatching(/^[+-]?[0-9., ]{0,40} ?[a-zA-Z.·-]{0,8}$/),
  );

  it('never throws, never gives NaN or a negative value, whatever comes', () => {
    fc.assert(
      fc.property(anyLine, (line) => {
        const parsed = parseTesterLine(line, newtonMetres);
        if (parsed.ok) return Number.isFinite(parsed.valueNm) && parsed.valueNm >= 0;
        return parsed.reason !== '';
      }),
      { numRuns: 2000 },
    );
  });

  it('gives back what a tester wrote, with point or comma', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 9_999_999 }),
        fc.integer({ min: 0, max: 4 }),
        fc.constantFrom('+', '-', ''),
        fc.constantFrom('.', ','),
        (digits, decimals, sign, point) => {
          const value = digits / 10 ** decimals;
          const text = `${sign}${value.toFixed(decimals).replace('.', point)} N.m`;
          expect(parseTesterLine(text, newtonMetres)).toEqual({
            ok: true,
            valueNm: Number(value.toFixed(decimals)),
            direction: sign === '' ? null : sign === '+' ? 'cw' : 'ccw',
          });
        },
      ),
    );
  });
});
