import type { PullView } from '@/lib/live/contract';
import { directionWords } from '@/lib/torque/words';

/** 'Pull 12, reading at 204 N·m clockwise' */
export const pullName = (pull: PullView): string => {
  const kind = pull.kind === 'exercise' ? 'exercise pull' : 'reading';
  return `Pull ${pull.sequence}, ${kind} at ${pull.target} ${directionWords(pull.direction)}`;
};

/** '201.6 N·m, delivers 1.2 % low' */
export function pullValue(pull: PullView): string {
  if (pull.outcome === 'no-release') return `did not let go by ${pull.reference ?? 'the end'}`;
  if (pull.reference === null) return 'not read';
  return pull.words ? `${pull.reference}, ${pull.words}` : pull.reference;
}

/** The newest pull that counts; null when there is none yet. */
export const lastAccepted = (pulls: readonly PullView[]): PullView | null =>
  pulls.findLast((pull) => pull.state === 'accepted') ?? null;

/** Pulls that can still be voided, oldest first. */
export const voidable = (pulls: readonly PullView[]): PullView[] =>
  pulls.filter((pull) => pull.state !== 'voided');

/** Are both pulled at the same point, or for the same exercise? */
export const samePoint = (one: PullView, other: PullView): boolean =>
  one.kind === other.kind && one.direction === other.direction && one.target === other.target;
