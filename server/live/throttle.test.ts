import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { createThrottle } from './throttle';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

const fail = (error: unknown) => {
  throw error;
};

it('works at once, and folds what follows into one at the window’s end', async () => {
  const work = vi.fn(async (_key: string) => undefined);
  const throttle = createThrottle(work, 500, fail);
  throttle.poke('a');
  throttle.poke('a');
  throttle.poke('a');
  expect(work).toHaveBeenCalledTimes(1);
  await vi.advanceTimersByTimeAsync(500);
  expect(work).toHaveBeenCalledTimes(2);
  await vi.advanceTimersByTimeAsync(2000);
  expect(work).toHaveBeenCalledTimes(2);
});

it('keeps keys apart', () => {
  const work = vi.fn(async (_key: string) => undefined);
  const throttle = createThrottle(work, 500, fail);
  throttle.poke('a');
  throttle.poke('b');
  expect(work.mock.calls).toEqual([['a'], ['b']]);
});

it('goes on after an error, and does nothing once closed', async () => {
  const errors: unknown[] = [];
  const work = vi.fn(async (_key: string) => Promise.reject(new Error('no store')));
  const throttle = createThrottle(work, 500, (error) => errors.push(error));
  throttle.poke('a');
  await vi.advanceTimersByTimeAsync(500);
  throttle.poke('a');
  await vi.advanceTimersByTimeAsync(0);
  expect(errors).toHaveLength(2);
  throttle.close();
  throttle.poke('a');
  expect(work).toHaveBeenCalledTimes(2);
});
