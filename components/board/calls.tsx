import clsx from 'clsx';
import { memo } from 'react';
import type { Call } from './arrange';
import css from './board.module.css';
import { Moving } from './moving';
import { calledWords } from './words';

/** The called tags, in the one colour that is kept for them. */
export const Calls = memo(function Calls({ calls, minute }: { calls: Call[]; minute: number }) {
  if (calls.length === 0) return null;
  const isOne = calls.length === 1;
  return (
    <section aria-labelledby="called">
      <h2 id="called" className="sr-only">
        Called
      </h2>
      <ul className={clsx(css.calls, !isOne && css.callsMany)}>
        {calls.map((call) => (
          <li key={call.code} className={clsx('ground-signal', css.call)}>
            <Moving code={call.code}>
              <p className={clsx('font-code font-bold', css.callCode)} data-cap="called">
                {call.code}
              </p>
            </Moving>
            <div>
              <p className={css.callWords} data-cap="state">
                Come to bench {call.bench}
              </p>
              {isOne && (
                <p className={css.quietLine}>{calledWords(call.calledAt, new Date(minute))}</p>
              )}
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
});
