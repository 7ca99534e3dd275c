import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';

const ROOT = path.join(import.meta.dirname, '..');
/** Written once a build is whole; what is newer than it was not built yet. */
const MARK = path.join(ROOT, '.next', 'whole-build');
const SOURCES = ['app', 'components', 'db', 'lib', 'server', 'public'];
const SETTINGS = [
  ...['next.config.mjs', 'postcss.config.mjs', 'tailwind.config.ts', 'tsconfig.json'],
  ...['package.json', 'package-lock.json'],
];

/** The newest change in a folder, ms: a folder's own time tells of what was taken away. */
function newestIn(folder) {
  const times = readdirSync(folder, { withFileTypes: true }).map((entry) => {
    const inside = path.join(folder, entry.name);
    return entry.isDirectory() ? newestIn(inside) : statSync(inside).mtimeMs;
  });
  return Math.max(statSync(folder).mtimeMs, ...times);
}

function isBuilt() {
  if (!existsSync(MARK)) return false;
  const built = statSync(MARK).mtimeMs;
  return (
    SOURCES.every((folder) => newestIn(path.join(ROOT, folder)) < built) &&
    SETTINGS.every((file) => statSync(path.join(ROOT, file)).mtimeMs < built)
  );
}

// A second start is quick, and takes no page away from under a server that runs on the same build.
if (process.argv.includes('--if-changed') && isBuilt()) process.exit(0);

const started = new Date();
rmSync(MARK, { force: true });
// Set here and not in the npm script, whose way to set a variable differs between systems.
const next = createRequire(import.meta.url).resolve('next/dist/bin/next');
const { status, error } = spawnSync(process.execPath, [next, 'build'], {
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
});
if (error) console.error(error.message);
if (status === 0) {
  // As old as the start of the build: what changed while it ran is not in it.
  writeFileSync(MARK, '');
  utimesSync(MARK, started, started);
}
process.exit(status ?? 1);
