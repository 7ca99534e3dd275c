import type { Reader } from '@/db/client';
import type { CheckSnapshot } from '@/lib/live/contract';
import { currentRevision } from '@/server/queries/revision';
import { loadCheckFile } from './load';
import { checkView } from './view';

/** The running check of a bench; `check` is null when none runs. */
export async function checkSnapshot(
  reader: Reader,
  benchId: string,
  now: Date,
): Promise<CheckSnapshot> {
  const revision = await currentRevision(reader);
  const file = await loadCheckFile(reader, { runningOnBench: benchId });
  return { revision, at: now.toISOString(), check: file ? checkView(file) : null };
}
