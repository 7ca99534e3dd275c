import { io } from 'socket.io-client';
import type { Snapshot } from '@/lib/live/contract';
import { sharedMs } from './clock';
import type { ClientOrder, ClientReport } from './clients';

// Runs in a process of its own, so that both servers meet the same kind of clients.

const tell = (report: ClientReport): void => void process.send?.(report);

/** How many clients have each revision; a revision is told once the last of them has it. */
function tally(total: number): (revision: number) => void {
  const counts = new Map<number, number>();
  return (revision) => {
    const count = (counts.get(revision) ?? 0) + 1;
    if (count < total) return void counts.set(revision, count);
    const atMs = sharedMs();
    counts.delete(revision);
    tell({ kind: 'heard', revision, atMs });
  };
}

async function connect(
  { url, clients }: ClientOrder,
  heard: (revision: number) => void,
): Promise<void> {
  for (const { rooms, event, cookie } of clients) {
    const socket = io(url, {
      transports: ['websocket'],
      forceNew: true,
      extraHeaders: cookie ? { cookie } : {},
    });
    let newest = -1;
    socket.on(event, (snapshot: Snapshot) => {
      if (snapshot.revision <= newest) return;
      newest = snapshot.revision;
      heard(snapshot.revision);
    });
    await new Promise<void>((resolve, reject) => {
      socket.once('connect', resolve);
      socket.once('connect_error', reject);
    });
    for (const room of rooms) {
      const answer: unknown = await socket.emitWithAck('room:join', room);
      if (!(answer as { ok: boolean }).ok) throw new Error(`No entry: ${JSON.stringify(answer)}`);
    }
  }
}

process.once('message', (order: ClientOrder) => {
  connect(order, tally(order.clients.length)).then(
    () => tell({ kind: 'connected' }),
    (error: unknown) => tell({ kind: 'failed', words: String(error) }),
  );
});
process.once('disconnect', () => process.exit());
