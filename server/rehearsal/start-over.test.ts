import { existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { lockDataFolder } from '@/db/lock';
import { markAsRehearsal, startOver } from './start-over';

describe('startOver', () => {
  let dataDir: string;
  beforeEach(() => {
    dataDir = mkdtempSync(path.join(os.tmpdir(), 'pullpost-start-over-'));
    mkdirSync(path.join(dataDir, 'db'));
    writeFileSync(path.join(dataDir, 'db', 'PG_VERSION'), '18');
    writeFileSync(path.join(dataDir, 'secret'), 'x');
  });
  afterEach(() => rmSync(dataDir, { recursive: true, force: true }));

  it('removes what a rehearsal has left, and nothing else', async () => {
    markAsRehearsal({ dataDir, databaseUrl: null });
    writeFileSync(path.join(dataDir, 'mine.txt'), 'kept');
    await startOver({ dataDir, databaseUrl: null });
    expect(readdirSync(dataDir)).toEqual(['mine.txt']);
  });

  it('does not touch a folder that is no rehearsal’s', async () => {
    await expect(startOver({ dataDir, databaseUrl: null })).rejects.toThrow(/not the folder of a/);
    expect(existsSync(path.join(dataDir, 'db', 'PG_VERSION'))).toBe(true);
  });

  it('does not touch anything when a database server is set', async () => {
    markAsRehearsal({ dataDir, databaseUrl: null });
    const databaseUrl = 'postgres://localhost/somewhere';
    await expect(startOver({ dataDir, databaseUrl })).rejects.toThrow(/DATABASE_URL/);
    expect(existsSync(path.join(dataDir, 'db', 'PG_VERSION'))).toBe(true);
  });

  it('does not pull the folder away from under a running server', async () => {
    markAsRehearsal({ dataDir, databaseUrl: null });
    const lock = await lockDataFolder(dataDir, new Date());
    await expect(startOver({ dataDir, databaseUrl: null })).rejects.toThrow(/in use by another/);
    await lock.release();
    expect(existsSync(path.join(dataDir, 'db', 'PG_VERSION'))).toBe(true);
  });

  it('has nothing to do where no rehearsal has been', async () => {
    const nowhere = path.join(dataDir, 'nowhere');
    await startOver({ dataDir: nowhere, databaseUrl: null });
    expect(existsSync(nowhere)).toBe(false);
  });
});
