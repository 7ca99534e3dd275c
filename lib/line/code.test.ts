import { describe, expect, it } from 'vitest';
import { parseTagCode, tagCode, TAGS_PER_MEET } from './code';

describe('tagCode', () => {
  it('counts from A01, and skips the letters that are taken for digits', () => {
    expect(tagCode(1)).toBe('A01');
    expect(tagCode(99)).toBe('A99');
    expect(tagCode(100)).toBe('B01');
    expect(tagCode(TAGS_PER_MEET)).toBe('Y99');
  });

  it('never gives one code twice in a meet, nor a letter of I, O, Q, S, Z', () => {
    const codes = Array.from({ length: TAGS_PER_MEET }, (_, index) => tagCode(index + 1));
    expect(new Set(codes).size).toBe(TAGS_PER_MEET);
    expect(codes.join('')).not.toMatch(/[IOQSZ]/);
  });

  it.each([0, -1, 1.5, Number.NaN, TAGS_PER_MEET + 1])('refuses %s', (sequence) => {
    expect(() => tagCode(sequence)).toThrow(RangeError);
  });
});

describe('parseTagCode', () => {
  it.each([
    ['a7', 'A07'],
    [' A 27 ', 'A27'],
    ['b-03', 'B03'],
  ])('reads %s', (text, code) => {
    expect(parseTagCode(text)).toBe(code);
  });

  it.each(['', 'A', '27', 'O12', 'A00', 'A127', 'A1x'])('refuses %j', (text) => {
    expect(parseTagCode(text)).toBeNull();
  });
});
