import { beforeEach, describe, expect, it } from 'vitest';
import { create } from 'qrcode';
import { makeWorld } from '@/tests/support/factories';
import { TEST_NOW, testStore, type TestStore } from '@/tests/support/store';
import { boardView, joinAddress, qrDrawing } from './view';

describe('qrDrawing', () => {
  it('draws every dark module once, and no light one', () => {
    const text = 'http://192.168.8.20:3000/m/test-meet/join';
    const { modules, path } = qrDrawing(text);
    const { size, data } = create(text, { errorCorrectionLevel: 'Q' }).modules;
    const drawn = new Uint8Array(size * size);
    for (const [, x, y, run] of path.matchAll(/M(\d+) (\d+)h(\d+)v1h-\d+z/g)) {
      for (let step = 0; step < Number(run); step += 1) {
        drawn[Number(y) * size + Number(x) + step]! += 1;
      }
    }
    expect(modules).toBe(size);
    expect([...drawn]).toEqual([...data].map((dark) => (dark ? 1 : 0)));
  });
});

it('carries the post’s origin, and shows it as people type it', () => {
  const join = joinAddress('http://192.168.8.20:3000', 'test-meet');
  expect(join.url).toBe('http://192.168.8.20:3000/m/test-meet/join');
  expect(join.text).toBe('192.168.8.20:3000/m/test-meet/join');
});

describe('boardView', () => {
  let store: TestStore;
  beforeEach(async () => {
    store = await testStore();
    await store.reset();
  });

  it('is the line of the meet, without names', async () => {
    const world = await makeWorld(store.db);
    const view = await boardView(store.db, world.meet.slug, {
      origin: 'http://192.168.8.20:3000',
      now: TEST_NOW,
    });
    expect(view!.line.waiting).toEqual([{ code: 'A01', held: false, withUs: false }]);
    expect(JSON.stringify(view)).not.toContain(world.staff.operator.name);
    expect(JSON.stringify(view)).not.toContain(world.tag.id);
  });

  it('is nothing for a meet that does not exist', async () => {
    const view = await boardView(store.db, 'no-such-meet', { origin: 'http://a', now: TEST_NOW });
    expect(view).toBeNull();
  });
});
