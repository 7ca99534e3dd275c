import { describe, expect, it } from 'vitest';
import { pullView } from '../fixtures';
import { lastAccepted, pullName, pullValue, samePoint, voidable } from './pull-words';

describe('words of a pull', () => {
  it('says what it was and what it gave', () => {
    expect(pullName(pullView())).toBe('Pull 13, reading at 204 N·m clockwise');
    expect(pullValue(pullView())).toBe('201.6 N·m, delivers 1.2 % low');
    expect(pullValue(pullView({ kind: 'exercise', reference: null, words: null }))).toBe(
      'not read',
    );
    expect(pullValue(pullView({ outcome: 'no-release', reference: '262 N·m', words: null }))).toBe(
      'did not let go by 262 N·m',
    );
  });
});

describe('which pulls', () => {
  const first = pullView({ sequence: 1 });
  const voided = pullView({ sequence: 2, state: 'voided', fault: 'slipped' });
  const offered = pullView({ sequence: 3, state: 'offered' });

  it('counts neither what is voided nor what still waits', () => {
    expect(lastAccepted([first, voided, offered])).toBe(first);
    expect(lastAccepted([voided])).toBeNull();
  });

  it('voids what is accepted and what waits, once', () => {
    expect(voidable([first, voided, offered])).toEqual([first, offered]);
  });

  it('tells points apart by kind, direction and target', () => {
    expect(samePoint(first, offered)).toBe(true);
    expect(samePoint(first, pullView({ direction: 'ccw' }))).toBe(false);
    expect(samePoint(first, pullView({ kind: 'exercise' }))).toBe(false);
    expect(samePoint(first, pullView({ target: '340 N·m' }))).toBe(false);
  });
});
