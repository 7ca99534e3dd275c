import { expect, it } from 'vitest';
import { countJoin } from './join-limit';

it('lets a crowd behind one address in, stops a flood, and leaves others alone', async () => {
  for (let count = 0; count < 60; count += 1) expect(await countJoin('10.0.0.7')).toBeNull();
  const wait = await countJoin('10.0.0.7');
  expect(wait).toBeGreaterThan(0);
  expect(wait).toBeLessThanOrEqual(60);
  expect(await countJoin('10.0.0.8')).toBeNull();
});
