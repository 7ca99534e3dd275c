import { describe, expect, it } from 'vitest';
import { moveTag, type TagFacts, type TagMove } from './machine';

const NOW = new Date('2026-10-09T10:00:00Z');
const START: TagFacts = {
  state: 'waiting',
  place: 'visitor',
  peg: null,
  benchId: null,
  heldUntil: null,
  unfitReason: null,
};
const after = (moves: TagMove[], from: TagFacts = START): TagFacts =>
  moves.reduce((tag, move) => moveTag(tag, move, NOW), from);

describe('moveTag', () => {
  it('goes the common way: called, on the bench, ready, returned', () => {
    const tag = after([
      { kind: 'call', benchId: 'b1' },
      { kind: 'take-on-bench', benchId: 'b1' },
      { kind: 'sign-off' },
      { kind: 'hand-back' },
    ]);
    expect(tag).toEqual({ ...START, state: 'returned', place: 'returned' });
  });

  it('takes a tool that was left with us without a call', () => {
    const tag = after([
      { kind: 'hang', peg: 14 },
      { kind: 'take-on-bench', benchId: 'b1' },
    ]);
    expect(tag).toMatchObject({ state: 'on_bench', place: 'bench', peg: null, benchId: 'b1' });
  });

  it('does not call for a tool that hangs on a peg', () => {
    expect(() =>
      after([
        { kind: 'hang', peg: 14 },
        { kind: 'call', benchId: 'b1' },
      ]),
    ).toThrow('left with us');
  });

  it('does not take a tool that its visitor still carries uncalled', () => {
    expect(() => after([{ kind: 'take-on-bench', benchId: 'b1' }])).toThrow('Call this tag first');
  });

  it('keeps a called tag to its own bench', () => {
    const called = after([{ kind: 'call', benchId: 'b1' }]);
    expect(() => moveTag(called, { kind: 'take-on-bench', benchId: 'b2' }, NOW)).toThrow(
      'another bench',
    );
  });

  it('passes over a held turn until the hold has run out', () => {
    const held = after([{ kind: 'hold', until: new Date('2026-10-09T10:20:00Z') }]);
    expect(() => moveTag(held, { kind: 'call', benchId: 'b1' }, NOW)).toThrow('held');
    const later = new Date('2026-10-09T10:21:00Z');
    expect(moveTag(held, { kind: 'call', benchId: 'b1' }, later)).toMatchObject({
      state: 'called',
      heldUntil: null,
    });
  });

  it('refuses a hold that ends in the past', () => {
    expect(() => after([{ kind: 'hold', until: NOW }])).toThrow('future');
  });

  it('lets a tag that did not come wait again', () => {
    const away = after([{ kind: 'call', benchId: 'b1' }, { kind: 'mark-away' }]);
    expect(away).toMatchObject({ state: 'away', benchId: null });
    expect(moveTag(away, { kind: 'return-to-line' }, NOW)).toEqual(START);
  });

  it('a withdrawn tool that hangs with us stays open until it is handed back', () => {
    const tag = after([{ kind: 'hang', peg: 3 }, { kind: 'withdraw' }]);
    expect(tag).toMatchObject({ state: 'withdrawn', place: 'peg', peg: 3 });
    expect(moveTag(tag, { kind: 'hand-back' }, NOW)).toMatchObject({
      state: 'withdrawn',
      place: 'returned',
    });
  });

  it('an unfit tool says why', () => {
    expect(() => after([{ kind: 'mark-unfit', reason: '  ' }])).toThrow('Say why');
    expect(after([{ kind: 'mark-unfit', reason: 'Cracked head' }]).unfitReason).toBe(
      'Cracked head',
    );
  });

  it('a ready tool can be checked a second time, and an abandoned one waits again', () => {
    const ready = after([
      { kind: 'call', benchId: 'b1' },
      { kind: 'take-on-bench', benchId: 'b1' },
      { kind: 'sign-off' },
    ]);
    const again = moveTag(ready, { kind: 'take-on-bench', benchId: 'b2' }, NOW);
    expect(again).toMatchObject({ state: 'on_bench', benchId: 'b2' });
    expect(moveTag(again, { kind: 'abandon', to: { peg: 5 } }, NOW)).toMatchObject({
      state: 'waiting',
      peg: 5,
    });
  });
});
