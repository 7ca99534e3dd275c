import { MAX_LINE_LENGTH } from './pattern';

/** What the splitter found, in the order it came. */
export type SplitPiece =
  | { kind: 'line'; text: string }
  /** A line beyond the cap: its first bytes. The rest of it is thrown away. */
  | { kind: 'too-long'; text: string }
  /** A line that stopped in the middle for so long that what follows is another one. */
  | { kind: 'broken-off'; text: string };

export interface LineSplitter {
  /** Takes the bytes that came at `atMs` (any steady clock, milliseconds). */
  push(chunk: Uint8Array, atMs: number): SplitPiece[];
  /** Drops the unfinished line and returns its text, '' when there is none. */
  reset(): string;
  /** Throws away everything up to the next line end. */
  skipLine(): void;
}

export interface SplitterOptions {
  /** Bytes a line may have. */
  maxBytes?: number;
  /** Milliseconds of silence within a line after which it counts as broken off. */
  maxGapMs?: number;
}

const LINE_FEED = 0x0a;
const CARRIAGE_RETURN = 0x0d;

/**
 * Splits a tester's bytes into lines ending in CR, LF or both, however the chunks fall. Blank
 * lines are left out. The unfinished line never grows beyond the cap.
 */
export function createLineSplitter(options: SplitterOptions = {}): LineSplitter {
  const { maxBytes = MAX_LINE_LENGTH, maxGapMs = 3000 } = options;
  let pending: number[] = [];
  let skipping = false;
  let lastMs: number | null = null;

  function takePending(): string {
    const text = decodeLine(pending);
    pending = [];
    return text;
  }

  return {
    push(chunk, atMs) {
      const pieces: SplitPiece[] = [];
      const add = (kind: SplitPiece['kind'], text: string) => {
        if (text.trim() !== '') pieces.push({ kind, text });
      };
      if (pending.length > 0 && lastMs !== null && atMs - lastMs > maxGapMs) {
        add('broken-off', takePending());
      }
      lastMs = atMs;
      for (const byte of chunk) {
        if (byte === LINE_FEED || byte === CARRIAGE_RETURN) {
          if (!skipping) add('line', takePending());
          skipping = false;
        } else if (!skipping) {
          pending.push(byte);
          if (pending.length > maxBytes) {
            add('too-long', takePending());
            skipping = true;
          }
        }
      }
      return pieces;
    },
    reset() {
      skipping = false;
      return takePending();
    },
    skipLine() {
      pending = [];
      skipping = true;
    },
  };
}

/** Testers write '·' in UTF-8 or in Latin-1: the bytes tell which. */
function decodeLine(bytes: readonly number[]): string {
  const array = Uint8Array.from(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(array);
  } catch {
    return String.fromCharCode(...bytes);
  }
}
