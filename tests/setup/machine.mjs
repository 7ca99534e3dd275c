import { spawnSync } from 'node:child_process';

const has = (command) =>
  spawnSync('sh', ['-c', `command -v ${command}`], { encoding: 'utf8' }).stdout.trim();

function install(packages) {
  console.log(`› apt-get install ${packages.join(' ')}`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const apt = (...args) =>
    spawnSync('apt-get', args, { stdio: ['ignore', 'ignore', 'inherit'], env }).status === 0;
  return apt('update', '-qq') && apt('install', '-y', '-qq', ...packages);
}

/**
 * The browser and the pseudo-terminals that the tests need. As root on Debian they are installed; as
 * anybody else we say how.
 */
export function prepareMachine() {
  const find = () => ({
    chromium:
      process.env.CHROMIUM || has('chromium') || has('chromium-browser') || has('google-chrome'),
    socat: has('socat'),
  });
  let found = find();
  const missing = Object.entries(found).flatMap(([name, at]) => (at ? [] : [name]));
  if (missing.length > 0 && process.getuid?.() === 0 && has('apt-get')) {
    install(missing);
    found = find();
  }
  const still = Object.entries(found).flatMap(([name, at]) => (at ? [] : [name]));
  if (still.length > 0) {
    console.error(
      `The tests need ${still.join(' and ')}. On Debian: sudo apt-get install ${still.join(' ')}\n` +
        'Elsewhere install them, and name the browser in the variable CHROMIUM if it is not on the path.',
    );
    console.log('\n0 passed, 1 failed');
    process.exit(1);
  }
  return found;
}
