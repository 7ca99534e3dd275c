import { spawn } from 'node:child_process';
import path from 'node:path';

export interface StartTry {
  code: number | null;
  /** What it said on stderr, without blank lines. */
  lines: string[];
}

const ROOT = path.join(import.meta.dirname, '../../..');
/** An account that owns nothing, on every Debian. */
const NOBODY = 65534;

/** Starts the real server file with these variables, and waits until it ends by itself. */
export async function tryStart(
  env: Record<string, string>,
  { asNobody = false } = {},
): Promise<StartTry> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: { ...process.env, DATABASE_URL: '', LOG_LEVEL: 'silent', PORT: '0', ...env },
    stdio: ['ignore', 'ignore', 'pipe'],
    ...(asNobody ? { uid: NOBODY, gid: NOBODY } : {}),
  });
  let text = '';
  child.stderr.on('data', (chunk: Buffer) => (text += chunk.toString()));
  const code = await new Promise<number | null>((resolve, reject) => {
    child.once('error', reject);
    child.once('close', resolve);
  });
  return { code, lines: text.split('\n').filter((line) => line.trim() !== '') };
}

/** Refused as a person can understand it: exit 1 and one line, which is no stack. */
export const isClear = ({ code, lines }: StartTry): boolean =>
  code === 1 && lines.length === 1 && !/^\s+at /m.test(lines.join('\n'));
