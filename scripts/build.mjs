import { spawnSync } from 'node:child_process';
import { createRequire } from 'node:module';

// Set here and not in the npm script, whose way to set a variable differs between systems.
const next = createRequire(import.meta.url).resolve('next/dist/bin/next');
const { status, error } = spawnSync(process.execPath, [next, 'build'], {
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
});
if (error) console.error(error.message);
process.exit(status ?? 1);
