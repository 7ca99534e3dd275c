import { describe, expect, it } from 'vitest';
import { compileLinePattern, DEFAULT_LINE_PATTERN, linePatternFault } from './pattern';

describe('compileLinePattern', () => {
  it.each([
    [DEFAULT_LINE_PATTERN],
    [String.raw`(?<value>\d+\.\d{3})`],
    [String.raw`^PK:\s*(?<sign>[+-])?(?<value>[\d.,]+)\s*(?<unit>N\.m|lbf\.ft|lbf\.in)\s*$`],
    [String.raw`\d+;\d+;(?<value>[+-]?\d+\.\d+);(?:Nm|ft-lb);OK`],
  ])('takes %s', (source) => {
    expect(linePatternFault(source)).toBeNull();
  });

  it.each([
    ['(?<value>\\d+', 'not a valid regular expression'],
    ['(?<value>1)|a)(?:b', 'not a valid regular expression'],
    ['\\d+', 'a group named value'],
    ['[(?<value>]\\d+', 'a group named value'],
    ['(?<value>(\\d+)+)', 'must not be repeated'],
    ['(?<value>(?:\\d|\\d){1,90})', 'must not be repeated'],
    ['(?<value>\\d+)\\k<value>', 'Back references'],
    ['(a)(?<value>\\d+)\\1', 'Back references'],
    ['(?=.*\\d)(?<value>.*)', 'ahead or behind'],
    ['(?<=\\+)(?<value>\\d+)', 'ahead or behind'],
    ['(?<value>.*.*.*.*\\d)', 'too long'],
    ['(?<value>a*[ab]*b*[bc]*c*[cd]*d*)', 'too long'],
    ['(?<value>\\s*\\d?\\s*\\d?\\s*\\d?\\s*)', 'too long'],
    [`(?<value>${'a?'.repeat(40)}\\d)`, 'too long'],
    [`(?<value>\\d)${'(?:a|a)'.repeat(25)}`, 'too long'],
    [`(?<value>${'\\d'.repeat(200)})`, 'at most 200 characters'],
  ])('refuses %s', (source, fault) => {
    expect(linePatternFault(source)).toContain(fault);
    expect(() => compileLinePattern(source)).toThrow(RangeError);
  });

  it('has to explain the whole line', () => {
    expect(compileLinePattern('(?<value>\\d+)').test('1234.5')).toBe(false);
    expect(compileLinePattern('a|(?<value>\\d+)').test('12b')).toBe(false);
  });

  it.each([
    [' '.repeat(199) + 'x!'],
    ['1'.repeat(199) + '!'],
    ['a-'.repeat(99) + '!'],
    ['1.'.repeat(99) + '!'],
  ])('is quick with the default pattern on a bad line (%#)', (line) => {
    const compiled = compileLinePattern(DEFAULT_LINE_PATTERN);
    const started = performance.now();
    expect(compiled.test(line)).toBe(false);
    expect(performance.now() - started).toBeLessThan(250);
  });
});
