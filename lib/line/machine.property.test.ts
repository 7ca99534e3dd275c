import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  isOpen,
  MOVES_FROM,
  moveTag,
  WrongMoveError,
  type TagFacts,
  type TagMove,
} from './machine';
import { TAG_STATES } from './states';

const NOW = new Date('2026-10-09T10:00:00Z');
const later = new Date('2026-10-09T10:30:00Z');

const START: TagFacts = {
  state: 'waiting',
  place: 'visitor',
  peg: null,
  benchId: null,
  heldUntil: null,
  unfitReason: null,
};

const anyMove: fc.Arbitrary<TagMove> = fc.oneof(
  fc.constantFrom('b1', 'b2').map((benchId) => ({ kind: 'call' as const, benchId })),
  fc.constantFrom('b1', 'b2').map((benchId) => ({ kind: 'take-on-bench' as const, benchId })),
  fc.integer({ min: 1, max: 40 }).map((peg) => ({ kind: 'hang' as const, peg })),
  fc.integer({ min: 1, max: 40 }).map((peg) => ({ kind: 'abandon' as const, to: { peg } })),
  fc.constant({ kind: 'abandon' as const, to: 'visitor' as const }),
  fc.constant({ kind: 'hold' as const, until: later }),
  fc.constant({ kind: 'mark-unfit' as const, reason: 'Cracked head' }),
  fc
    .constantFrom(
      ...(['mark-away', 'return-to-line', 'release', 'sign-off', 'hand-back', 'withdraw'] as const),
    )
    .map((kind) => ({ kind })),
);

/** Every tag that some sequence of moves can lead to, refused moves skipped. */
const reachable = fc.array(anyMove, { maxLength: 40 }).map((moves) =>
  moves.reduce<TagFacts>((tag, move) => {
    try {
      return moveTag(tag, move, NOW);
    } catch (error) {
      if (error instanceof WrongMoveError) return tag;
      throw error;
    }
  }, START),
);

describe('every tag that can be reached', () => {
  it('has a peg exactly when it hangs, and a bench when it lies on one or is called to one', () => {
    fc.assert(
      fc.property(reachable, (tag) => {
        expect(tag.peg !== null).toBe(tag.place === 'peg');
        expect(tag.benchId !== null).toBe(tag.place === 'bench' || tag.state === 'called');
      }),
      { numRuns: 500 },
    );
  });

  it('is on a bench in place when it is so in state, and only a waiting one is held', () => {
    fc.assert(
      fc.property(reachable, (tag) => {
        if (tag.state === 'on_bench') expect(tag.place).toBe('bench');
        if (tag.heldUntil !== null) expect(tag.state).toBe('waiting');
        if (tag.state === 'called') expect(tag.place).toBe('visitor');
      }),
      { numRuns: 500 },
    );
  });

  it('never loses a tool: what we have stays open until it is handed back', () => {
    fc.assert(
      fc.property(reachable, anyMove, (tag, move) => {
        const withUs = tag.place === 'peg' || tag.place === 'bench';
        let after: TagFacts;
        try {
          after = moveTag(tag, move, NOW);
        } catch {
          return;
        }
        if (withUs && !isOpen(after)) expect(move.kind).toBe('hand-back');
        if (!isOpen(tag)) throw new Error(`a returned tool moved by ${move.kind}`);
      }),
      { numRuns: 1000 },
    );
  });

  it('a returned tag never moves again', () => {
    const returned: TagFacts = { ...START, state: 'returned', place: 'returned' };
    fc.assert(
      fc.property(anyMove, (move) => {
        expect(() => moveTag(returned, move, NOW)).toThrow(WrongMoveError);
      }),
    );
  });
});

describe('every state and every move', () => {
  for (const state of TAG_STATES) {
    for (const [kind, from] of Object.entries(MOVES_FROM)) {
      if (from.includes(state)) continue;
      it(`${kind} is refused when ${state}`, () => {
        const move = { kind, benchId: 'b1', peg: 1, until: later, to: 'visitor', reason: 'x' };
        expect(() => moveTag({ ...START, state }, move as TagMove, NOW)).toThrow(WrongMoveError);
      });
    }
  }
});
