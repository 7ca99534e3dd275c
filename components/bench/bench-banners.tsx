'use client';

import { timeWords } from '@/lib/format/time';
import type { RoomState } from '../live/use-room';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { useBench } from './bench-context';
import type { BenchLive, BenchNotice } from './use-bench-live';

interface BenchBannersProps {
  room: RoomState;
  notice: BenchNotice | null;
  onDismiss: () => void;
}

/** Is there anything that these banners must say? */
export const hasBanner = ({ room, notice, bench }: Pick<BenchLive, 'room' | 'notice' | 'bench'>) =>
  !room.connected ||
  room.refused !== null ||
  notice !== null ||
  bench.tester?.instrument.state === 'lost';

/** What stands in the way of the work, whatever is being done: connection, cable, news of the tester. */
export function BenchBanners({ room, notice, onDismiss }: BenchBannersProps) {
  const { bench } = useBench();
  const zone = bench.meet.timeZone;
  const instrument = bench.tester?.instrument;
  const isLost = instrument?.state === 'lost';
  if (!hasBanner({ room, notice, bench })) return null;
  return (
    <section aria-label="News of the bench" className="flex flex-col gap-2 px-6 pt-3">
      {room.refused !== null && (
        <Notice kind="problem" className="py-2!">
          <strong>The post does not show this bench any more.</strong> {room.refused} Reload the
          page to sign in again.
        </Notice>
      )}
      {!room.connected && (
        <Notice kind="problem" className="py-2!">
          <strong>No connection to the post.</strong>{' '}
          {room.heardAt ? `Last heard ${timeWords(room.heardAt, zone)}. ` : ''}
          What was accepted is safe, and what you typed is kept. It goes on by itself.
        </Notice>
      )}
      {isLost && (
        <Notice kind="problem" className="py-2!">
          <strong>The tester does not answer: look at its cable.</strong> {instrument.message}{' '}
          Nothing is lost. It goes on when the cable is back; until then you can type what the
          tester shows.
        </Notice>
      )}
      {notice && (
        <div className="flex items-stretch gap-2">
          <Notice className="flex-1 py-2!">
            <strong>{timeWords(new Date(notice.at), zone)}, from the tester:</strong> {notice.words}
          </Notice>
          <Button variant="secondary" onClick={onDismiss}>
            Seen
          </Button>
        </div>
      )}
    </section>
  );
}

/** Why no verdict can be given here now. Stands before the first pull of every check. */
export function BarredNotice() {
  const { bench } = useBench();
  if (!bench.tester) {
    return (
      <Notice kind="problem" title="No tester stands on this bench">
        No check can start here. A lead puts a tester on it at the desk.
      </Notice>
    );
  }
  if (bench.tester.barred.length === 0) return null;
  return (
    <Notice kind="problem" className="text-lg">
      <p className="text-2xl leading-snug font-bold">
        Every verdict on this bench will be “not judged”, because{' '}
        {bench.tester.barred.join(', and ')}.
      </p>
      <p className="mt-1">Tell the visitor before the first pull, or ask a lead.</p>
    </Notice>
  );
}
