import { describe, expect, it } from 'vitest';
import { TOOL_CLASSES } from './tool';
import { VISITOR_TOOL_KINDS, visitorToolKind } from './visitor-kinds';
import { deviationWords, listWords, reasonWords, toolKindWords } from './words';

describe('deviationWords', () => {
  it('says low when the tool says more than it delivers, on either basis', () => {
    expect(deviationWords(2.1, 'reference')).toBe('delivers 2.1 % low');
    expect(deviationWords(-2.1, 'set')).toBe('delivers 2.1 % low');
    expect(deviationWords(-0.44, 'reference')).toBe('delivers 0.4 % high');
    expect(deviationWords(0.44, 'set')).toBe('delivers 0.4 % high');
  });
  it('says nothing of a deviation that it would print as zero', () => {
    expect(deviationWords(0, 'reference')).toBe('delivers as set');
    expect(deviationWords(-0.04, 'set')).toBe('delivers as set');
  });
  it('refuses what is no number', () => {
    expect(() => deviationWords(Number.NaN, 'set')).toThrow(RangeError);
  });
});

describe('words', () => {
  it('list', () => {
    expect(listWords([])).toBe('');
    expect(listWords(['a'])).toBe('a');
    expect(listWords(['a', 'b', 'c'])).toBe('a, b and c');
  });
  it('every class has a kind of its own', () => {
    expect(new Set(TOOL_CLASSES.map(toolKindWords)).size).toBe(TOOL_CLASSES.length);
  });
  it('an unknown reason is shown as it stands', () => {
    expect(reasonWords('tester-locked')).toBe('the tester is locked');
    expect(reasonWords('struck by lightning')).toBe('struck by lightning');
  });
});

describe('VISITOR_TOOL_KINDS', () => {
  it('covers every class, with values of their own', () => {
    expect(new Set(VISITOR_TOOL_KINDS.map((kind) => kind.toolClass))).toEqual(
      new Set(TOOL_CLASSES),
    );
    expect(new Set(VISITOR_TOOL_KINDS.map((kind) => kind.value)).size).toBe(
      VISITOR_TOOL_KINDS.length,
    );
  });
  it('not sure is the only one that the operator has to settle', () => {
    expect(VISITOR_TOOL_KINDS.filter((kind) => kind.unsure).map((kind) => kind.value)).toEqual([
      'not-sure',
    ]);
    expect(visitorToolKind('adapter')?.toolClass).toBe('I-C');
    expect(visitorToolKind('hammer')).toBeUndefined();
  });
});
