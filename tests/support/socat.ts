import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, open, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** Two pseudo-terminals joined by a cable: what goes in at one end comes out at the other. */
export interface SerialCable {
  /** The end that Pullpost opens. */
  postEnd: string;
  /** The end of the tester. */
  testerEnd: string;
  /** Writes bytes as the tester would. */
  send(text: string | Uint8Array): Promise<void>;
  /** Pulls the cable out: both ends are gone, at once. */
  pullOut(): Promise<void>;
  /** Puts it back, under the same names. */
  plugIn(): Promise<void>;
  /** Pulls it out and clears the folder. */
  remove(): Promise<void>;
}

const READY_WITHIN_MS = 10_000;

/**
 * Lays a cable with socat.
 * @throws Error when socat is not installed, or does not come up within ten seconds.
 */
export async function laySerialCable(): Promise<SerialCable> {
  const folder = await mkdtemp(path.join(tmpdir(), 'pullpost-cable-'));
  const postEnd = path.join(folder, 'post');
  const testerEnd = path.join(folder, 'tester');
  let socat: ChildProcess | null = null;

  const cable: SerialCable = {
    postEnd,
    testerEnd,
    async send(text) {
      const file = await open(testerEnd, 'r+');
      try {
        await file.write(typeof text === 'string' ? Buffer.from(text) : text);
      } finally {
        await file.close();
      }
    },
    async pullOut() {
      const running = socat;
      socat = null;
      if (!running || running.exitCode !== null || running.signalCode !== null) return;
      const gone = new Promise((resolve) => running.once('exit', resolve));
      running.kill();
      await gone;
    },
    async plugIn() {
      socat = await startSocat([postEnd, testerEnd]);
    },
    async remove() {
      await cable.pullOut();
      await rm(folder, { recursive: true, force: true });
    },
  };
  await cable.plugIn();
  return cable;
}

async function startSocat(links: string[]): Promise<ChildProcess> {
  const ends = links.map((link) => `pty,raw,echo=0,link=${link}`);
  const socat = spawn('socat', ['-d', '-d', ...ends], { stdio: ['ignore', 'ignore', 'pipe'] });
  let said = '';
  let failure: Error | null = null;
  socat.stderr.on('data', (chunk: Buffer) => (said += chunk.toString()));
  socat.once('error', (error: NodeJS.ErrnoException) => {
    failure =
      error.code === 'ENOENT'
        ? new Error("These tests need socat (Debian: 'apt-get install socat').")
        : error;
  });
  const deadline = Date.now() + READY_WITHIN_MS;
  // The transfer loop starts once both ends exist; only then do bytes pass.
  while (!(
    said.includes('starting data transfer loop') && links.every((link) => existsSync(link))
  )) {
    if (failure) throw failure;
    if (socat.exitCode !== null) throw new Error(`socat ended: ${said}`);
    if (Date.now() > deadline) {
      socat.kill();
      throw new Error(`socat did not come up within ${READY_WITHIN_MS} ms: ${said}`);
    }
    await new Promise((resolve) => setTimeout(resolve, 10));
  }
  return socat;
}
