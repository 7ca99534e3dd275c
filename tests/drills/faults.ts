import { mkdtempSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { lookAfter, startWriter, type AcceptedPull, type Aftermath } from './faults/kills';
import { isClear, tryStart, type StartTry } from './faults/start';
import { startCases } from './faults/start-cases';
import { median } from './size/scene';

/** How often the writer is killed, all on one folder. */
const ROUNDS = 10;
/** A writer is killed within this time of its first pull, milliseconds. */
const LATEST_KILL_MS = 2000;

const say = (words: string): void => void process.stderr.write(`${words}\n`);
const sleep = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms));

async function main(): Promise<void> {
  const dataDir = mkdtempSync(path.join(os.tmpdir(), 'pullpost-faults-'));
  const rounds: Aftermath[] = [];
  const everything: AcceptedPull[] = [];
  let second: StartTry | null = null;
  let holderNamed = false;
  for (let round = 1; round <= ROUNDS; round += 1) {
    const writer = await startWriter(dataDir);
    if (!second) {
      second = await tryStart({ PULLPOST_DATA: dataDir });
      holderNamed = second.lines.join(' ').includes(`process ${writer.pid}`);
    }
    await sleep(Math.random() * LATEST_KILL_MS);
    everything.push(...(await writer.kill()));
    // Every pull of every round so far: a later kill must not take an earlier pull either.
    const after = await lookAfter(dataDir, everything);
    rounds.push(after);
    say(`round ${round} of ${ROUNDS}: ${after.said} said, ${after.lost.length} lost`);
  }

  const starts: { name: string; clear: boolean; said: string[] }[] = [];
  for (const { name, env, asNobody } of startCases()) {
    const tried = await tryStart(env, { asNobody });
    starts.push({ name, clear: isClear(tried), said: tried.lines });
    say(`${name}: ${tried.lines.join(' / ')}`);
  }

  const met =
    rounds.every(({ lost, ledgerDuplicates }) => lost.length === 0 && ledgerDuplicates === 0) &&
    isClear(second!) &&
    holderNamed &&
    starts.every(({ clear }) => clear);
  const report = {
    node: process.version,
    kills: {
      rounds,
      medianCommandMs: median(everything.map(({ commandMs }) => commandMs)),
      medianDiskMs: median(everything.map(({ diskMs }) => diskMs)),
    },
    secondServer: { said: second!.lines, holderNamed },
    starts,
    met,
  };
  process.stdout.write(`${JSON.stringify(report, null, 2)}\n`);
  process.exit(met ? 0 : 1);
}

main().catch((error: unknown) => {
  console.error(error);
  process.exit(1);
});
