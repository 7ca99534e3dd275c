import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createLineSplitter, type SplitPiece } from './line-splitter';

const bytes = (text: string) => new TextEncoder().encode(text);
const texts = (pieces: SplitPiece[]) => pieces.map(({ text }) => text);

describe('createLineSplitter', () => {
  it('splits at CR, LF and both, and leaves out blank lines', () => {
    const splitter = createLineSplitter();
    expect(texts(splitter.push(bytes('1\r\n2\r3\n\n4'), 0))).toEqual(['1', '2', '3']);
    expect(texts(splitter.push(bytes('5\r'), 1))).toEqual(['45']);
    expect(splitter.push(bytes('\n'), 2)).toEqual([]);
  });

  it('gives the same lines however the chunks fall', () => {
    const line = fc.stringMatching(/^[+-]?[0-9]{1,6} N·m$/);
    fc.assert(
      fc.property(fc.array(line), fc.array(fc.nat(40)), (lines, cuts) => {
        const all = bytes(lines.map((text) => `${text}\r\n`).join(''));
        const splitter = createLineSplitter();
        const found: SplitPiece[] = [];
        let start = 0;
        for (const size of [...cuts, all.length]) {
          found.push(...splitter.push(all.subarray(start, start + size), 0));
          start += size;
        }
        expect(texts(found)).toEqual(lines);
      }),
    );
  });

  it('tells a line beyond the cap once, and reads the next', () => {
    const splitter = createLineSplitter({ maxBytes: 10 });
    const pieces = splitter.push(bytes(`${'x'.repeat(500)}\n12.5\n`), 0);
    expect(pieces).toEqual([
      { kind: 'too-long', text: 'x'.repeat(11) },
      { kind: 'line', text: '12.5' },
    ]);
  });

  it('never joins what came before a long silence to what comes after', () => {
    const splitter = createLineSplitter({ maxGapMs: 3000 });
    splitter.push(bytes('1'), 0);
    expect(splitter.push(bytes('45.6\n'), 3001)).toEqual([
      { kind: 'broken-off', text: '1' },
      { kind: 'line', text: '45.6' },
    ]);
    splitter.push(bytes('7'), 4000);
    expect(texts(splitter.push(bytes('8\n'), 7000))).toEqual(['78']);
  });

  it('hands out the unfinished line once, and skips the rest of one', () => {
    const splitter = createLineSplitter();
    splitter.push(bytes('12.'), 0);
    expect(splitter.reset()).toBe('12.');
    expect(splitter.reset()).toBe('');
    splitter.skipLine();
    expect(texts(splitter.push(bytes('34\n56\n'), 0))).toEqual(['56']);
  });

  it('reads a middle dot in UTF-8 and in Latin-1', () => {
    const splitter = createLineSplitter();
    const latin = Uint8Array.from([0x31, 0x4e, 0xb7, 0x6d, 0x0a]);
    expect(texts(splitter.push(latin, 0))).toEqual(['1N·m']);
    expect(texts(splitter.push(bytes('1N·m\n'), 0))).toEqual(['1N·m']);
  });
});
