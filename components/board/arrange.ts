import type { LineBench, LineSnapshot } from '@/lib/live/contract';

/** A board with more codes than this is not read, but searched. */
export const MAX_CODES = 12;
/** Places on the wall: benches, hanging tags, codes of the line after them. */
const MAX_BENCHES = 4;
const MAX_NEXT = 4;
const MAX_THEN = 4;
/** The last line holds finished tools and the tags after the next; they share its width. */
const MAX_THEN_BESIDE_READY = 3;
const MAX_READY = 2;

export interface Call {
  code: string;
  bench: number;
  calledAt: string;
}

/** What hangs where: everything that fits, in the order of what matters most. */
export interface Arrangement {
  calls: Call[];
  benches: LineBench[];
  /** Two rows of benches: tags are smaller and the last line may be left out. */
  isTight: boolean;
  next: LineSnapshot['waiting'];
  then: LineSnapshot['waiting'];
  /** Waiting tags that are not shown; the last line says how many. */
  moreWaiting: number;
  /** Checked tools on pegs; those on a bench are shown there. */
  ready: LineSnapshot['ready'];
  moreReady: number;
  isEmpty: boolean;
}

/**
 * Arranges a line on the wall. Called tags come first, then benches, the next tags, and what is left
 * of {@link MAX_CODES} goes to finished tools and to the tags after the next.
 */
export function arrange(line: LineSnapshot): Arrangement {
  const calls = line.benches
    .flatMap(({ called, number }) => (called ? [{ ...called, bench: number }] : []))
    .slice(0, MAX_BENCHES);
  const staffed = line.benches.filter(
    (bench) => bench.state !== 'closed' || bench.tag !== null || bench.called !== null,
  );
  // Many benches: one that waits for its called tag is on the wall already, in the call.
  const benches = (
    staffed.length > 2
      ? staffed.filter((bench) => !calls.some((call) => call.bench === bench.number))
      : staffed
  ).slice(0, MAX_BENCHES);
  const isTight = benches.length > 2 || calls.length > 2;

  const lying = benches.flatMap((bench) => (bench.tag ? [bench.tag.code] : []));
  const onPegs = line.ready.filter((tag) => !lying.includes(tag.code));
  const hasLastLine = !(isTight && calls.length > 0);
  const ready = hasLastLine ? onPegs.slice(0, MAX_READY) : [];
  const room = MAX_CODES - calls.length - lying.length - ready.length;
  const next = line.waiting.slice(0, Math.min(MAX_NEXT, room));
  const maxThen = ready.length > 0 ? MAX_THEN_BESIDE_READY : MAX_THEN;
  const then = hasLastLine
    ? line.waiting.slice(next.length, next.length + Math.min(maxThen, room - next.length))
    : [];
  return {
    calls,
    benches,
    isTight,
    next,
    then,
    moreWaiting: line.waiting.length - next.length - then.length,
    ready,
    moreReady: hasLastLine ? onPegs.length - ready.length : 0,
    isEmpty: calls.length === 0 && lying.length === 0 && line.waiting.length === 0,
  };
}

/** Changes exactly when some tag hangs somewhere else. */
export const placesOf = ({ calls, benches, next, then, ready }: Arrangement): string =>
  JSON.stringify([
    calls.map((call) => call.code),
    benches.map((bench) => bench.tag?.code ?? null),
    ...[next, then, ready].map((tags) => tags.map((tag) => tag.code)),
  ]);
