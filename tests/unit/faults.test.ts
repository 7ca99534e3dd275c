import { mkdtempSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { startWords } from '@/server/start-words';
import { lookAfter, startWriter, type AcceptedPull } from '../drills/faults/kills';
import { isClear, tryStart } from '../drills/faults/start';
import { startCases } from '../drills/faults/start-cases';

// Each of these starts processes, which takes seconds on a busy machine.
const PATIENCE_MS = 120_000;

describe('a server that is killed', () => {
  it(
    'loses no pull that it had answered for, names itself while it lives, and frees its folder',
    async () => {
      const dataDir = mkdtempSync(path.join(os.tmpdir(), 'pullpost-faults-'));
      const said: AcceptedPull[] = [];
      for (let round = 0; round < 2; round += 1) {
        const writer = await startWriter(dataDir);
        if (round === 0) {
          const second = await tryStart({ PULLPOST_DATA: dataDir });
          expect(second).toMatchObject({ code: 1 });
          expect(second.lines).toEqual([expect.stringContaining(`process ${writer.pid}`)]);
        }
        said.push(...(await writer.kill()));
        const after = await lookAfter(dataDir, said);
        expect(after).toEqual({ said: said.length, lost: [], ledgerDuplicates: 0 });
      }
      expect(said.length).toBeGreaterThan(1);
    },
    PATIENCE_MS,
  );
});

describe('a server that cannot start', () => {
  it.each(startCases())(
    'says so in one line: $name',
    async ({ env, asNobody, says }) => {
      const tried = await tryStart(env, { asNobody });
      expect(tried.lines.join('\n')).toMatch(says);
      expect(isClear(tried), tried.lines.join('\n')).toBe(true);
    },
    PATIENCE_MS,
  );

  const where = { dataDir: '/data', host: '127.0.0.1', port: 3000, hasDatabaseUrl: false };
  const listenError = (port: number, host: string): Promise<unknown> =>
    new Promise((resolve) => {
      createServer().once('error', resolve).listen(port, host);
    });

  it('tells a port that is taken from a folder that is closed', async () => {
    const holder = createServer();
    await new Promise<void>((resolve) => holder.listen(0, '127.0.0.1', resolve));
    const { port } = holder.address() as AddressInfo;
    const words = startWords(await listenError(port, '127.0.0.1'), { ...where, port });
    expect(words).toBe(
      `Port ${port} of 127.0.0.1 cannot be opened (EADDRINUSE): another program has it. Set PORT to a free one.`,
    );
    holder.close();
    const denied = Object.assign(new Error('listen EACCES'), { code: 'EACCES', syscall: 'listen' });
    expect(startWords(denied, { ...where, port: 80 })).toContain('Set PORT to 1024 or above');
  });

  it('says that an address is not of this machine', async () => {
    // TEST-NET-1 of RFC 5737: nobody has it.
    const host = '192.0.2.1';
    expect(startWords(await listenError(0, host), { ...where, host })).toContain('Set HOST');
  });

  it('keeps the stack of what it does not know', () => {
    expect(startWords(new TypeError('x is not a function'), where)).toBeNull();
    const elsewhere = { code: 'ENOENT', path: '/app/some-module.js' };
    expect(startWords(Object.assign(new Error('ENOENT'), elsewhere), where)).toBeNull();
  });
});
