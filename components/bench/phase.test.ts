import { describe, expect, it } from 'vitest';
import { benchSnapshot, checkView, stepView, tagView } from './fixtures';
import { phaseOf } from './phase';

const me = 'me';

describe('phaseOf', () => {
  it('is not mine until I have taken the bench, whatever lies on it', () => {
    const bench = benchSnapshot({ tag: tagView({ state: 'on_bench', place: 'bench' }) });
    bench.bench.operator = { id: 'somebody', name: 'Somebody' };
    expect(phaseOf(bench, null, me)).toBe('not-mine');
    expect(phaseOf(bench, checkView(), me)).toBe('not-mine');
    bench.bench.operator = null;
    expect(phaseOf(bench, null, me)).toBe('not-mine');
  });

  it('follows the tag from the line to its owner', () => {
    expect(phaseOf(benchSnapshot(), null, me)).toBe('free');
    const called = { ...tagView({ state: 'called' }), calledAt: '2026-06-13T09:00:00Z' };
    expect(phaseOf(benchSnapshot({ called }), null, me)).toBe('called');
    const lying = (state: 'on_bench' | 'ready' | 'unfit' | 'withdrawn') =>
      benchSnapshot({ tag: tagView({ state, place: 'bench' }) });
    expect(phaseOf(lying('on_bench'), null, me)).toBe('start');
    expect(phaseOf(lying('on_bench'), checkView({ step: stepView() }), me)).toBe('pull');
    expect(phaseOf(lying('on_bench'), checkView({ step: null }), me)).toBe('sign-off');
    expect(phaseOf(lying('ready'), null, me)).toBe('ready');
    expect(phaseOf(lying('unfit'), null, me)).toBe('closed-tag');
    expect(phaseOf(lying('withdrawn'), null, me)).toBe('closed-tag');
  });

  it('stays with the pulls while a value of the tester waits for a decision', () => {
    const check = checkView({ step: null });
    expect(phaseOf(benchSnapshot(), { ...check, offered: check.pulls[0]! }, me)).toBe('pull');
  });

  it('is shut only when nothing is at it', () => {
    const shut = benchSnapshot();
    shut.bench.state = 'paused';
    expect(phaseOf(shut, null, me)).toBe('shut');
    const busy = benchSnapshot({ tag: tagView({ state: 'ready', place: 'bench' }) });
    busy.bench.state = 'paused';
    expect(phaseOf(busy, null, me)).toBe('ready');
  });
});
