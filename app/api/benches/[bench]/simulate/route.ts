import { z } from 'zod';
import { requireStaff } from '@/server/access/current';
import { problemResponse } from '@/server/edge';
import { isSimulated } from '@/server/instruments/simulated';
import { Problem } from '@/server/problem';
import { testerOfBench } from '@/server/queries/bench/tester';
import { getRuntime } from '@/server/runtime';

/** Asks the simulated tester of a bench for the pull that the bench waits for. */
export async function POST(_request: Request, { params }: { params: Promise<{ bench: string }> }) {
  try {
    await requireStaff('read.bench');
    const { store, instruments } = getRuntime();
    const { bench: benchId } = await params;
    const bench = z.uuid().safeParse(benchId).success
      ? await testerOfBench(store.db, benchId)
      : undefined;
    if (!bench) throw new Problem('not-found', 'There is no such bench.');
    const instrument = bench.testerId ? instruments.get(bench.testerId) : null;
    if (!instrument || !isSimulated(instrument)) {
      throw new Problem('wrong-move', 'The tester of this bench is not a simulated one.');
    }
    if (!instrument.trigger()) {
      throw new Problem('wrong-move', 'A pull is under way already, or none is due.');
    }
    return Response.json({ started: true });
  } catch (error) {
    return problemResponse(error);
  }
}
