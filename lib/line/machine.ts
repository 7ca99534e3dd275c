import type { TagPlace, TagState } from './states';

/** The three facts that a tag carries: its state, where the tool is, and whether its turn is held. */
export interface TagFacts {
  state: TagState;
  place: TagPlace;
  /** Peg number while `place` is `peg`, else null. */
  peg: number | null;
  /** The bench that the tag is called to, or that the tool lies on; else null. */
  benchId: string | null;
  /** The turn is held until this instant; null when it is not held. */
  heldUntil: Date | null;
  /** Why the tool cannot be checked; only when `state` is `unfit`. */
  unfitReason: string | null;
}

export type TagMove =
  | { kind: 'call'; benchId: string }
  | { kind: 'mark-away' }
  | { kind: 'return-to-line' }
  | { kind: 'hold'; until: Date }
  | { kind: 'release' }
  | { kind: 'hang'; peg: number }
  | { kind: 'take-on-bench'; benchId: string }
  | { kind: 'abandon'; to: 'visitor' | { peg: number } }
  | { kind: 'sign-off' }
  | { kind: 'hand-back' }
  | { kind: 'withdraw' }
  | { kind: 'mark-unfit'; reason: string };

export type TagMoveKind = TagMove['kind'];

/** A move that the machine does not allow. `code` is matched across bundles, not the class. */
export class WrongMoveError extends Error {
  readonly code = 'wrong-move';
}

const STATE_WORDS: Record<TagState, string> = {
  waiting: 'waiting',
  called: 'called',
  on_bench: 'on the bench',
  ready: 'ready to collect',
  returned: 'returned',
  away: 'away',
  withdrawn: 'withdrawn',
  unfit: 'unfit for a check',
};

/** Plain words for a state, as staff read them. */
export const stateWords = (state: TagState): string => STATE_WORDS[state];

/** The states in which each move may start. */
export const MOVES_FROM: Record<TagMoveKind, readonly TagState[]> = {
  call: ['waiting'],
  'mark-away': ['called'],
  'return-to-line': ['called', 'away'],
  hold: ['waiting'],
  release: ['waiting'],
  hang: ['waiting', 'called', 'away', 'ready', 'withdrawn', 'unfit'],
  'take-on-bench': ['waiting', 'called', 'ready'],
  abandon: ['on_bench'],
  'sign-off': ['on_bench'],
  'hand-back': ['ready', 'withdrawn', 'unfit'],
  withdraw: ['waiting', 'called', 'away'],
  'mark-unfit': ['waiting', 'called', 'away', 'on_bench'],
};

const refuse = (words: string): never => {
  throw new WrongMoveError(words);
};

const isHeld = (tag: TagFacts, now: Date): boolean =>
  tag.heldUntil !== null && tag.heldUntil.getTime() > now.getTime();

/** A tool that its visitor still carries is already back where it belongs once the tag closes. */
const closed = (tag: TagFacts, state: 'withdrawn' | 'unfit'): TagFacts => ({
  ...tag,
  state,
  place: tag.place === 'visitor' ? 'returned' : tag.place,
  benchId: tag.place === 'bench' ? tag.benchId : null,
  heldUntil: null,
});

/**
 * The one state machine of a tag: the facts after `move`, or a {@link WrongMoveError} that says why
 * not. Pure; `now` decides whether a hold has run out.
 */
export function moveTag(tag: TagFacts, move: TagMove, now: Date): TagFacts {
  if (!MOVES_FROM[move.kind].includes(tag.state)) {
    refuse(`This tag is ${STATE_WORDS[tag.state]}, so it cannot ${MOVE_WORDS[move.kind]}.`);
  }
  switch (move.kind) {
    case 'call':
      if (tag.place !== 'visitor')
        refuse('The tool was left with us: take it on the bench, no call is needed.');
      if (isHeld(tag, now)) refuse('This turn is held. Release the hold first.');
      return { ...tag, state: 'called', benchId: move.benchId, heldUntil: null };
    case 'mark-away':
      return { ...tag, state: 'away', benchId: null };
    case 'return-to-line':
      return { ...tag, state: 'waiting', benchId: null };
    case 'hold':
      if (move.until.getTime() <= now.getTime()) refuse('A hold must end in the future.');
      return { ...tag, heldUntil: move.until };
    case 'release':
      return { ...tag, heldUntil: null };
    case 'hang':
      if (tag.place === 'returned') refuse('The tool has gone home with its owner.');
      if (tag.state === 'called')
        return { ...tag, state: 'waiting', place: 'peg', peg: move.peg, benchId: null };
      return { ...tag, place: 'peg', peg: move.peg, benchId: null };
    case 'take-on-bench':
      if (tag.state === 'waiting' && tag.place === 'visitor')
        refuse('Call this tag first: its owner has the tool.');
      if (tag.state === 'waiting' && isHeld(tag, now))
        refuse('This turn is held. Release the hold first.');
      if (tag.state === 'called' && tag.benchId !== move.benchId)
        refuse('This tag is called to another bench.');
      return {
        ...tag,
        state: 'on_bench',
        place: 'bench',
        peg: null,
        benchId: move.benchId,
        heldUntil: null,
      };
    case 'abandon':
      return move.to === 'visitor'
        ? { ...tag, state: 'waiting', place: 'visitor', peg: null, benchId: null }
        : { ...tag, state: 'waiting', place: 'peg', peg: move.to.peg, benchId: null };
    case 'sign-off':
      return { ...tag, state: 'ready' };
    case 'hand-back':
      if (tag.place === 'returned') refuse('This tool has already gone home.');
      return {
        ...tag,
        state: tag.state === 'ready' ? 'returned' : tag.state,
        place: 'returned',
        peg: null,
        benchId: null,
      };
    case 'withdraw':
      return closed(tag, 'withdrawn');
    case 'mark-unfit':
      if (move.reason.trim() === '') refuse('Say why the tool cannot be checked.');
      return { ...closed(tag, 'unfit'), unfitReason: move.reason.trim() };
  }
}

const MOVE_WORDS: Record<TagMoveKind, string> = {
  call: 'be called',
  'mark-away': 'be marked away',
  'return-to-line': 'go back to the line',
  hold: 'be held',
  release: 'be released',
  hang: 'hang on a peg',
  'take-on-bench': 'be taken on a bench',
  abandon: 'be abandoned',
  'sign-off': 'be signed off',
  'hand-back': 'be handed back',
  withdraw: 'be withdrawn',
  'mark-unfit': 'be marked unfit',
};

/** A tag is open until its tool is back with its owner. */
export const isOpen = (tag: Pick<TagFacts, 'place'>): boolean => tag.place !== 'returned';
