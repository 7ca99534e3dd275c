import { describe, expect, it } from 'vitest';
import { createTurns } from './turns';

describe('createTurns', () => {
  it('starts a read when the one before has ended', async () => {
    const inTurn = createTurns();
    const seen: string[] = [];
    const read = (name: string) => async () => {
      seen.push(`${name} starts`);
      await new Promise((resolve) => setTimeout(resolve, 5));
      seen.push(`${name} ends`);
      return name;
    };
    const both = await Promise.all([inTurn(read('line')), inTurn(read('desk'))]);
    expect(both).toEqual(['line', 'desk']);
    expect(seen).toEqual(['line starts', 'line ends', 'desk starts', 'desk ends']);
  });

  it('goes on after a read that failed, and tells the one who asked', async () => {
    const inTurn = createTurns();
    const failed = inTurn(() => Promise.reject(new Error('no such meet')));
    const next = inTurn(() => Promise.resolve('next'));
    await expect(failed).rejects.toThrow('no such meet');
    await expect(next).resolves.toBe('next');
  });
});
