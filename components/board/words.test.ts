import { describe, expect, it } from 'vitest';
import { calledWords, callWords, toolsWords } from './words';

describe('calledWords', () => {
  const calledAt = '2026-06-13T09:00:00.000Z';

  it.each([
    ['2026-06-13T08:59:58.000Z', 'Called just now'],
    ['2026-06-13T09:00:59.999Z', 'Called just now'],
    ['2026-06-13T09:01:00.000Z', 'Called 1 min ago'],
    ['2026-06-13T10:05:10.000Z', 'Called 65 min ago'],
  ])('at %s: %s', (now, words) => {
    expect(calledWords(calledAt, new Date(now))).toBe(words);
  });
});

it('says who is called to which bench', () => {
  expect(callWords([])).toBe('');
  expect(
    callWords([
      { code: 'A31', bench: 2 },
      { code: 'A32', bench: 1 },
    ]),
  ).toBe('A31, come to bench 2. A32, come to bench 1.');
});

it('counts one tool as one', () => {
  expect([toolsWords(0), toolsWords(1), toolsWords(2)]).toEqual(['0 tools', '1 tool', '2 tools']);
});
