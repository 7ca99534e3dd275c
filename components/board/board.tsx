'use client';

import clsx from 'clsx';
import { useMemo, type CSSProperties } from 'react';
import { useNewest, useRoom } from '@/components/live/use-room';
import { Pegboard } from '@/components/tag/pegboard';
import { timeWords } from '@/lib/format/time';
import type { LineSnapshot } from '@/lib/live/contract';
import { arrange, placesOf, type Arrangement } from './arrange';
import { BenchTile } from './bench-tile';
import { BoardHeader } from './board-header';
import css from './board.module.css';
import { Calls } from './calls';
import { JoinPanel, type JoinAddress } from './join-panel';
import { LastLine, NextRow } from './line-rows';
import { MovingWall } from './moving';
import { CAP_PX } from './sizes';
import { usePostClock } from './use-post-clock';
import { callWords } from './words';

const caps = { '--cap-called': CAP_PX.called, '--cap-state': CAP_PX.state } as CSSProperties;

/** The big board of a meet: live, without personal data, read from across a paddock. */
export function Board({ initial, join }: { initial: LineSnapshot; join: JoinAddress }) {
  const [line, offer] = useNewest(initial);
  const clock = usePostClock(initial.at);
  const room = useRoom(
    { room: 'line', meetId: initial.meetId },
    {
      'line:changed': (next) => {
        clock.sync(next.at);
        offer(next);
      },
    },
  );
  const arrangement = useMemo(() => arrange(line), [line]);
  const lostAt = room.heardAt ? clock.atPost(room.heardAt) : new Date(line.at);
  const isLost = !room.connected || room.refused !== null;
  const minute = Math.floor(clock.now.getTime() / 10_000) * 10_000;
  return (
    <div className={css.board} style={caps}>
      <Pegboard as="main" className={css.wall}>
        <BoardHeader
          meetName={line.meetName}
          time={timeWords(clock.now, line.timeZone)}
          lost={
            isLost
              ? `Lost the post at ${timeWords(lostAt, line.timeZone)}. This board may be old.`
              : null
          }
        />
        <p className="sr-only" aria-live="polite">
          {callWords(arrangement.calls)}
        </p>
        <MovingWall places={placesOf(arrangement)}>
          <Calls calls={arrangement.calls} minute={minute} />
          <Hangings arrangement={arrangement} joinOpen={line.joinOpen} />
        </MovingWall>
      </Pegboard>
      <JoinPanel line={line} join={join} />
    </div>
  );
}

function Hangings({ arrangement, joinOpen }: { arrangement: Arrangement; joinOpen: boolean }) {
  const { benches, isTight, isEmpty, next } = arrangement;
  return (
    <div className={css.hangings}>
      {isEmpty && <Invite joinOpen={joinOpen} />}
      {benches.length > 0 && (
        <section aria-labelledby="benches">
          <h2 id="benches" className="sr-only">
            On the benches
          </h2>
          <ul className={clsx(css.benches, benches.length === 1 && css.benchesOne)}>
            {benches.map((bench) => (
              <BenchTile key={bench.id} bench={bench} isTight={isTight} />
            ))}
          </ul>
        </section>
      )}
      {next.length > 0 && <NextRow next={next} />}
      {next.length === 0 && !isEmpty && (
        <p className={css.state}>
          {joinOpen ? 'Nobody is waiting. Join now and you are next.' : 'Nobody is waiting.'}
        </p>
      )}
      <LastLine arrangement={arrangement} />
    </div>
  );
}

function Invite({ joinOpen }: { joinOpen: boolean }) {
  return (
    <section aria-labelledby="invite" className={css.invite}>
      <h2 id="invite" className={clsx('font-code font-bold', css.inviteWords)}>
        {joinOpen ? 'No line. You are next.' : 'Nobody is waiting'}
      </h2>
      <p className={css.state}>
        {joinOpen
          ? 'Bring your torque wrench. See what it really delivers.'
          : 'The line is closed to new tools just now.'}
      </p>
    </section>
  );
}
