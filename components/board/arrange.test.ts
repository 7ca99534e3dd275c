import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arrange, MAX_CODES, placesOf } from './arrange';
import { benchOf, lineOf } from './fixture';

const onBench = (code: string) => ({ code, state: 'on_bench' as const, tool: 'Click wrench' });
const calledAt = '2026-06-13T08:59:00.000Z';

describe('arrange', () => {
  it('hangs four next tags, four after them, and counts the rest', () => {
    const { next, then, moreWaiting } = arrange(lineOf(18));
    expect(next.map((tag) => tag.code)).toEqual(['A01', 'A02', 'A03', 'A04']);
    expect(then.map((tag) => tag.code)).toEqual(['A05', 'A06', 'A07', 'A08']);
    expect(moreWaiting).toBe(10);
  });

  it('keeps held tags in their place', () => {
    const line = lineOf(3);
    line.waiting[1]!.held = true;
    expect(arrange(line).next[1]).toEqual({ code: 'A02', held: true, withUs: false });
  });

  it('shows a finished tool once: on its bench, or else as ready on its peg', () => {
    const line = lineOf(0, {
      benches: [benchOf(1, { tag: { ...onBench('B01'), state: 'ready' } })],
      ready: [
        { code: 'B01', where: 'bench 1' },
        { code: 'B02', where: 'peg 3' },
      ],
    });
    expect(arrange(line).ready).toEqual([{ code: 'B02', where: 'peg 3' }]);
  });

  it('keeps both of two benches on the wall, and of more only those without a call', () => {
    const called = { called: { code: 'B01', calledAt } };
    const two = arrange(lineOf(4, { benches: [benchOf(1, called), benchOf(2)] }));
    expect(two.benches.map((bench) => bench.number)).toEqual([1, 2]);
    const four = arrange(
      lineOf(4, { benches: [benchOf(1, called), benchOf(2), benchOf(3), benchOf(4)] }),
    );
    expect(four.benches.map((bench) => bench.number)).toEqual([2, 3, 4]);
    expect(four.isTight).toBe(true);
  });

  it('leaves a closed bench out, but not the tool that still lies on it', () => {
    const benches = [
      benchOf(1, { state: 'closed' }),
      benchOf(2, { state: 'closed', tag: onBench('B07') }),
    ];
    expect(arrange(lineOf(0, { benches })).benches.map((bench) => bench.number)).toEqual([2]);
  });

  it('is empty only when nobody waits, is called or lies on a bench', () => {
    expect(arrange(lineOf(0)).isEmpty).toBe(true);
    expect(arrange(lineOf(1)).isEmpty).toBe(false);
    expect(arrange(lineOf(0, { benches: [benchOf(1, { tag: onBench('B01') })] })).isEmpty).toBe(
      false,
    );
  });

  it('never shows more than twelve codes, nor one twice, and loses none without counting it', () => {
    const bench = fc.record({
      kind: fc.constantFrom('free', 'called', 'busy', 'ready', 'closed'),
    });
    fc.assert(
      fc.property(
        fc.nat(80),
        fc.array(bench, { minLength: 1, maxLength: 6 }),
        fc.nat(6),
        (waiting, kinds, onPegs) => {
          const benches = kinds.map(({ kind }, index) =>
            benchOf(index + 1, {
              state: kind === 'closed' ? 'closed' : 'open',
              called: kind === 'called' ? { code: `C0${index}`, calledAt } : null,
              tag:
                kind === 'busy' || kind === 'ready'
                  ? { ...onBench(`B0${index}`), state: kind === 'ready' ? 'ready' : 'on_bench' }
                  : null,
            }),
          );
          const ready = Array.from({ length: onPegs }, (_, index) => ({
            code: `D0${index}`,
            where: `peg ${index}`,
          }));
          const found = arrange(lineOf(waiting, { benches, ready }));
          const codes = [
            ...found.calls.map((call) => call.code),
            ...found.benches.flatMap((one) => (one.tag ? [one.tag.code] : [])),
            ...[...found.next, ...found.then, ...found.ready].map((tag) => tag.code),
          ];
          expect(codes.length).toBeLessThanOrEqual(MAX_CODES);
          expect(new Set(codes).size).toBe(codes.length);
          expect(found.next.length + found.then.length + found.moreWaiting).toBe(waiting);
        },
      ),
    );
  });
});

describe('placesOf', () => {
  it('changes when a tag moves, not when a reading is taken', () => {
    const before = lineOf(3, {
      benches: [benchOf(1, { tag: onBench('B01'), words: 'Reading 1 of 15' })],
    });
    const read = lineOf(3, {
      benches: [benchOf(1, { tag: onBench('B01'), words: 'Reading 2 of 15' })],
    });
    expect(placesOf(arrange(read))).toBe(placesOf(arrange(before)));
    expect(placesOf(arrange(lineOf(2)))).not.toBe(placesOf(arrange(lineOf(3))));
  });
});
