import { readFileSync } from 'node:fs';
import path from 'node:path';
import { brotliDecompressSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { CAP_PX, CAP_RATIO, capMm } from './sizes';

describe('letter heights on a 43-inch screen', () => {
  it('are at least what 10 m and 5 m ask for', () => {
    expect(capMm(CAP_PX.called)).toBeGreaterThanOrEqual(58);
    expect(capMm(CAP_PX.code)).toBeGreaterThanOrEqual(46.5);
    expect(capMm(CAP_PX.state)).toBeGreaterThanOrEqual(23);
  });

  it.each(['600', '700'])('rest on the cap height of the shipped font, weight %s', (weight) => {
    expect(capRatioOf(weight)).toBeCloseTo(CAP_RATIO, 3);
  });
});

/** sCapHeight over unitsPerEm, read from a WOFF2 file (its OS/2 and head tables are stored plain). */
function capRatioOf(weight: string): number {
  const file = readFileSync(
    path.join(
      import.meta.dirname,
      '../../node_modules/@fontsource/barlow-condensed/files',
      `barlow-condensed-latin-${weight}-normal.woff2`,
    ),
  );
  const tableCount = file.readUInt16BE(12);
  const compressedSize = file.readUInt32BE(20);
  let at = 48;
  const base128 = (): number => {
    let value = 0;
    for (;;) {
      const byte = file.readUInt8(at++);
      value = value * 128 + (byte & 0x7f);
      if ((byte & 0x80) === 0) return value;
    }
  };
  // Known tags by number (WOFF2, section 4.1): 1 head, 6 OS/2, 10 glyf, 11 loca.
  const offsets = new Map<number, number>();
  let offset = 0;
  for (let index = 0; index < tableCount; index += 1) {
    const flags = file.readUInt8(at++);
    const tag = flags & 0x3f;
    if (tag === 0x3f) at += 4;
    const length = base128();
    const version = flags >> 6;
    const isTransformed = tag === 10 || tag === 11 ? version !== 3 : version !== 0;
    const stored = isTransformed ? base128() : length;
    offsets.set(tag, offset);
    offset += stored;
  }
  const tables = brotliDecompressSync(file.subarray(at, at + compressedSize));
  const unitsPerEm = tables.readUInt16BE(offsets.get(1)! + 18);
  return tables.readInt16BE(offsets.get(6)! + 88) / unitsPerEm;
}
