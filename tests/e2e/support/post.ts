import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, readFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

const ROOT = path.join(import.meta.dirname, '../../..');

/** A real server of the built application in a process of its own, on a folder and a free port. */
export interface RunningPost {
  origin: string;
  dataDir: string;
  /** The one-time code from the log; null when the post had an owner already. */
  setupCode: string | null;
  /** The post's secret, as the server wrote it beside its database. */
  secret(): string;
  /** Stops it as a person would; with `kill`, as a power cut would. */
  stop(options?: { kill?: boolean }): Promise<void>;
  /** Starts again on the same data and the same port. */
  restart(): Promise<void>;
}

interface PostOptions {
  flags?: string[];
  /** What its QR codes carry, where that is not its own address. */
  origin?: string;
}

interface Started {
  child: ChildProcess;
  port: number;
  setupCode: string | null;
}

const START_MS = 60_000;

function start(
  dataDir: string,
  port: number,
  { flags = [], origin }: PostOptions,
): Promise<Started> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts', ...flags], {
    cwd: ROOT,
    env: {
      ...process.env,
      PULLPOST_DATA: dataDir,
      PORT: String(port),
      HOST: '127.0.0.1',
      PULLPOST_ORIGIN: origin ?? (port === 0 ? '' : `http://127.0.0.1:${port}`),
      LOG_LEVEL: 'info',
      NODE_OPTIONS: '',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  return new Promise((resolve, reject) => {
    let log = '';
    const timer = setTimeout(() => {
      child.kill('SIGKILL');
      reject(new Error(`The server did not open within ${START_MS / 1000} s:\n${log}`));
    }, START_MS);
    const ended = (code: number | null) =>
      reject(new Error(`The server ended with ${code}:\n${log}`));
    child.once('exit', ended);
    const read = (chunk: Buffer) => {
      log += chunk.toString('utf8');
      const open = /"port":(\d+)[^\n]*Pullpost is open/.exec(log);
      if (!open) return;
      clearTimeout(timer);
      child.off('exit', ended);
      // What it still says is let flow, so that it never waits for a reader.
      for (const stream of [child.stdout!, child.stderr!]) stream.off('data', read).resume();
      const code = /set-up code is ([A-Z0-9]{4}-[A-Z0-9]{4})/.exec(log);
      resolve({ child, port: Number(open[1]), setupCode: code?.[1] ?? null });
    };
    child.stdout!.on('data', read);
    child.stderr!.on('data', read);
  });
}

export async function startPost(options: PostOptions = {}): Promise<RunningPost> {
  const dataDir = mkdtempSync(path.join(os.tmpdir(), 'pullpost-e2e-'));
  let running = await start(dataDir, 0, options);
  const { port, setupCode } = running;
  return {
    origin: `http://127.0.0.1:${port}`,
    dataDir,
    setupCode,
    secret: () => readFileSync(path.join(dataDir, 'secret'), 'utf8').trim(),
    async stop({ kill = false } = {}) {
      if (running.child.exitCode !== null || running.child.signalCode !== null) return;
      const gone = new Promise((resolve) => running.child.once('exit', resolve));
      running.child.kill(kill ? 'SIGKILL' : 'SIGTERM');
      await gone;
    },
    async restart() {
      running = await start(dataDir, port, options);
    },
  };
}
