import { spawn } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { expect, it } from 'vitest';
import { lockDataFolder } from './lock';

const folder = () => mkdtempSync(path.join(os.tmpdir(), 'pullpost-lock-'));
const now = new Date('2026-10-09T10:00:00Z');

it('is taken once, says who holds it, and is free again after release', async () => {
  const dir = folder();
  const lock = await lockDataFolder(dir, now);
  await expect(lockDataFolder(dir, now)).rejects.toThrow(`process ${process.pid}`);
  await lock.release();
  await (await lockDataFolder(dir, now)).release();
});

it('tells folders apart', async () => {
  const one = await lockDataFolder(folder(), now);
  const two = await lockDataFolder(folder(), now);
  await one.release();
  await two.release();
});

it('refuses a folder that another process holds, and takes it over when that one was killed', async () => {
  const dir = folder();
  const script = `import('${path.join(import.meta.dirname, 'lock.ts')}').then(async ({ lockDataFolder }) => {
    await lockDataFolder('${dir}', new Date());
    console.log('held');
    setInterval(() => {}, 1000);
  })`;
  const holder = spawn(process.execPath, ['--import', 'tsx', '-e', script], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  await new Promise<void>((resolve) => holder.stdout.once('data', () => resolve()));
  await expect(lockDataFolder(dir, now)).rejects.toMatchObject({
    code: 'data-folder-locked',
    holder: { pid: holder.pid },
  });
  holder.kill('SIGKILL');
  await new Promise((resolve) => holder.once('exit', resolve));
  await (await lockDataFolder(dir, now)).release();
});
