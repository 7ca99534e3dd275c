import clsx from 'clsx';
import type { LineSnapshot } from '@/lib/live/contract';
import css from './board.module.css';
import { QrCode, type QrDrawing } from './qr-code';
import { TodayCounts } from './today-counts';

export interface JoinAddress {
  /** Without 'http://', as it is typed. */
  text: string;
  qr: QrDrawing;
}

/** The chalk side: how to join, how many wait, and what today's checks found. */
export function JoinPanel({ line, join }: { line: LineSnapshot; join: JoinAddress }) {
  const waiting = line.waiting.length;
  return (
    <aside aria-label="Join the line" className={clsx('ground-chalk', css.panel)}>
      <h2 className={clsx('font-code font-bold', css.panelTitle)}>
        {line.joinOpen ? 'Bring your torque wrench' : 'The line is closed'}
      </h2>
      {line.joinOpen ? (
        <>
          <p>Scan to join. Walk around. We call you.</p>
          <div className={css.join}>
            <QrCode
              drawing={join.qr}
              quiet={0}
              className={css.qr}
              label="QR code of the address to join"
            />
            <p className={clsx('font-reading mt-2.5', css.address)}>{breakable(join.text)}</p>
          </div>
        </>
      ) : (
        <p>No new tools just now. Ask at the post. Tools in the line are still checked.</p>
      )}
      <div className={css.foot}>
        <p className={css.waiting}>
          <span className={clsx('font-code font-bold', css.waitingCount)}>{waiting}</span>
          <span>{waiting === 1 ? 'tool waiting' : 'tools waiting'}</span>
        </p>
        <TodayCounts today={line.today} />
      </div>
    </aside>
  );
}

/** A long address breaks before its path, not in the middle of a word. */
function breakable(address: string) {
  const slash = address.indexOf('/');
  if (slash < 0) return address;
  return (
    <>
      {address.slice(0, slash)}
      <wbr />
      {address.slice(slash)}
    </>
  );
}
