import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { listen } from './listen';
import { say } from './report';

const ROOT = path.join(import.meta.dirname, '../..');
const LEFT_OUT = new Set(['.git', '.next', '.data', 'node_modules', 'test-results', 'docs']);
const START_MS = 120_000;

export interface BuiltCopy {
  url: string;
  /** What the rehearsal has printed: where everything is. */
  announcement: string;
  close(): Promise<void>;
}

/** Copies the tree, with one page more that shows a word and nothing else. */
function copyTree(into: string): void {
  cpSync(ROOT, into, {
    recursive: true,
    filter: (file) => !LEFT_OUT.has(path.relative(ROOT, file)),
  });
  mkdirSync(path.join(into, 'app/empty'));
  const page = 'export default function Empty() {\n  return <p>Empty</p>;\n}\n';
  writeFileSync(path.join(into, 'app/empty/page.tsx'), page);
  // Types are checked elsewhere; they change nothing of what a browser loads.
  renameSync(path.join(into, 'next.config.mjs'), path.join(into, 'own.config.mjs'));
  writeFileSync(
    path.join(into, 'next.config.mjs'),
    "import own from './own.config.mjs';\nexport default { ...own, typescript: { ignoreBuildErrors: true } };\n",
  );
  // Hard links: the bundler follows no link out of the tree, and a copy would take minutes.
  const modules = [path.join(ROOT, 'node_modules'), path.join(into, 'node_modules')] as const;
  if (spawnSync('cp', ['-al', ...modules]).status !== 0)
    cpSync(...modules, { recursive: true, verbatimSymlinks: true });
}

function run(folder: string, args: string[], env: Record<string, string> = {}): ChildProcess {
  return spawn(process.execPath, args, {
    cwd: folder,
    env: {
      ...process.env,
      NODE_ENV: 'production',
      NEXT_TELEMETRY_DISABLED: '1',
      LOG_LEVEL: 'warn',
      ...env,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
}

async function build(folder: string): Promise<void> {
  const child = run(folder, ['node_modules/next/dist/bin/next', 'build']);
  let output = '';
  for (const stream of [child.stdout, child.stderr])
    stream?.on('data', (text: Buffer) => (output += text.toString()));
  const code = await new Promise((resolve) => child.once('exit', resolve));
  if (code !== 0) throw new Error(`The build of the copy failed (${code}):\n${output}`);
}

async function freePort(): Promise<string> {
  const http = createServer();
  const { port } = new URL(await listen(http));
  await new Promise((resolve) => http.close(resolve));
  return port;
}

const answers = (url: string): Promise<boolean> =>
  fetch(`${url}/empty`).then(
    (response) => response.ok,
    () => false,
  );

/** Builds a copy of this tree with one empty page, and serves its rehearsal on a free port. */
export async function buildCopy(): Promise<BuiltCopy> {
  const folder = mkdtempSync(path.join(tmpdir(), 'pullpost-bench-'));
  const remove = () => rmSync(folder, { recursive: true, force: true });
  try {
    say('first-load JavaScript: copying and building, a minute or two');
    copyTree(folder);
    await build(folder);
    say('first-load JavaScript: starting the rehearsal');
    const port = await freePort();
    const url = `http://127.0.0.1:${port}`;
    const args = ['--import', 'tsx', 'server/index.ts', '--rehearsal'];
    const data = path.join(folder, '.data');
    const child = run(folder, args, { PORT: port, PULLPOST_DATA: data, DATABASE_URL: '' });
    const ended = new Promise((resolve) => child.once('exit', resolve));
    let announcement = '';
    let errors = '';
    child.stdout?.on('data', (text: Buffer) => (announcement += text.toString()));
    child.stderr?.on('data', (text: Buffer) => (errors += text.toString()));
    const until = Date.now() + START_MS;
    while (!announcement.includes('Ctrl-C') || !(await answers(url))) {
      if (Date.now() > until || child.exitCode !== null) {
        child.kill('SIGKILL');
        throw new Error(`The copy does not start:\n${announcement}\n${errors}`);
      }
      await new Promise((resolve) => setTimeout(resolve, 250));
    }
    return {
      url,
      announcement,
      async close() {
        child.kill('SIGTERM');
        await ended;
        remove();
      },
    };
  } catch (error) {
    remove();
    throw error;
  }
}
