import { describe, expect, it } from 'vitest';
import { benchOf } from '@/components/board/fixture';
import { tagActions } from './actions';
import { deskOf, deskTag } from './fixture';
import { lineRows, type DeskTag } from './rows';

const free = [benchOf(1), benchOf(2)];
const commandsOf = (values: Partial<DeskTag>, benches = free) => {
  const [row] = lineRows(deskOf([deskTag('A01', values)]));
  return tagActions(row!, benches).map((action) => action.command);
};
const actionOf = (command: string, values: Partial<DeskTag> = {}) => {
  const [row] = lineRows(deskOf([deskTag('A01', values)]));
  return tagActions(row!, free).find((action) => action.command === command)!;
};

describe('what a lead can do with a tag', () => {
  it.each<[string, Partial<DeskTag>, string[]]>([
    [
      'waiting',
      {},
      ['tag.call', 'tag.move', 'tag.hold', 'tag.hang', 'tag.mark-unfit', 'tag.withdraw'],
    ],
    [
      'held',
      { heldUntil: '2026-06-13T09:10:00.000Z' },
      ['tag.move', 'tag.release', 'tag.hold', 'tag.hang', 'tag.mark-unfit', 'tag.withdraw'],
    ],
    [
      'called',
      { state: 'called', benchNumber: 1 },
      ['tag.return-to-line', 'tag.mark-away', 'tag.hang', 'tag.mark-unfit', 'tag.withdraw'],
    ],
    ['on a bench', { state: 'on_bench', place: 'bench', benchNumber: 1 }, ['tag.mark-unfit']],
    ['ready', { state: 'ready', place: 'peg', peg: 3 }, ['tag.hang', 'tag.hand-back']],
    [
      'away',
      { state: 'away' },
      ['tag.return-to-line', 'tag.hang', 'tag.mark-unfit', 'tag.withdraw'],
    ],
    ['unfit, with us', { state: 'unfit', place: 'peg', peg: 3 }, ['tag.hang', 'tag.hand-back']],
    ['returned', { state: 'returned', place: 'returned' }, []],
  ])('%s', (_, values, commands) => {
    expect(commandsOf(values)).toEqual(commands);
  });

  it('calls only to a bench that is open and free', () => {
    const busy = [
      benchOf(1, { state: 'paused' }),
      benchOf(2, { called: { code: 'A07', calledAt: '2026-06-13T09:00:00.000Z' } }),
    ];
    expect(commandsOf({}, busy)).not.toContain('tag.call');
    expect(actionOf('tag.call').fields[0]!.options).toHaveLength(2);
  });

  it('takes a tool that was left with us without a call', () => {
    expect(actionOf('tag.call', { place: 'peg', peg: 14 }).submit).toBe('Take A01 on the bench');
  });

  it('makes the command’s input from what was typed', () => {
    expect(actionOf('tag.move').input({ place: '3', reason: 'Leaves at noon' })).toEqual({
      place: 3,
      reason: 'Leaves at noon',
    });
    expect(actionOf('tag.hang').input({ peg: ' ' })).toEqual({ peg: null });
    expect(actionOf('tag.hang').input({ peg: '14' })).toEqual({ peg: 14 });
  });
});
