import { expect, it } from 'vitest';
import { POLICY } from '@/server/access/policy';
import { commandWords, detailWords } from './words';

it('has words for every command that may be run, and keeps the name of an unknown one', () => {
  const commands = Object.keys(POLICY).filter((name) => !name.startsWith('read.'));
  expect(commands.filter((name) => commandWords(name) === name)).toEqual([]);
  expect(commandWords('tag.unheard-of')).toBe('tag.unheard-of');
});

it('tells a detail in words, without ids and what other columns tell', () => {
  expect(
    detailWords({
      code: 'A27',
      state: 'on_bench',
      toPlace: 3,
      tagId: '01900000-0000-7000-8000-100000000001',
      reason: 'Leaves at noon',
      peg: null,
      stoppedEarly: false,
      barred: ['not-proved-today'],
      nested: { any: 'thing' },
    }),
  ).toBe(
    'state on bench · to place 3 · reason Leaves at noon · stopped early no · barred not-proved-today',
  );
  expect(detailWords({})).toBe('');
});
