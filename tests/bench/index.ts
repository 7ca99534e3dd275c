import { parseArgs } from 'node:util';
import { measureJs } from './js';
import { measureCall } from './live-call';
import { measurePull } from './live-pull';
import { measureSql } from './sql';
import { say, type Measurement } from './report';

const PARTS: Record<string, () => Promise<Measurement[]>> = {
  live: async () => [await measureCall(), await measurePull()],
  sql: async () => [await measureSql()],
  js: measureJs,
};

const { values: flags } = parseArgs({ options: { only: { type: 'string' } } });

async function main(): Promise<void> {
  const names = flags.only ? [flags.only] : Object.keys(PARTS);
  const measurements: Measurement[] = [];
  for (const name of names) {
    const part = PARTS[name];
    if (!part) throw new Error(`--only takes one of: ${Object.keys(PARTS).join(', ')}.`);
    measurements.push(...(await part()));
  }
  const met = measurements.every((one) => one.met);
  process.stdout.write(
    `${JSON.stringify({ node: process.version, measurements, met }, null, 2)}\n`,
  );
  for (const one of measurements) {
    say(`${one.met ? 'met   ' : 'MISSED'} ${one.name}: ${one.ratio} (limit ${one.limit})`);
  }
  process.exit(met ? 0 : 1);
}

main().catch((error: unknown) => {
  console.error(error);
  process.exit(1);
});
