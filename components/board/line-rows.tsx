import clsx from 'clsx';
import { Tag } from '@/components/tag/tag';
import type { LineSnapshot } from '@/lib/live/contract';
import type { Arrangement } from './arrange';
import css from './board.module.css';
import { Moving } from './moving';
import { CAP_PX } from './sizes';

type Waiting = LineSnapshot['waiting'][number];

const markOf = (tag: Waiting): string | undefined =>
  tag.held ? 'Held' : tag.withUs ? 'With us' : undefined;

/** The next tags, on their pegs. */
export function NextRow({ next }: { next: Waiting[] }) {
  return (
    <section aria-labelledby="next" className={css.row}>
      <h2 id="next" className={clsx('text-fore-quiet', css.state, css.rowLabel)}>
        Next
      </h2>
      <ol className={css.next}>
        {next.map((tag) => (
          <Moving key={tag.code} code={tag.code} as="li" className={css.nextTag}>
            <Tag
              code={tag.code}
              size="board"
              hangs
              capHeight={`calc(${CAP_PX.code} * var(--u))`}
              line={markOf(tag)}
            />
          </Moving>
        ))}
      </ol>
    </section>
  );
}

/** The tags after the next, how many more there are, and finished tools on their pegs. */
export function LastLine({ arrangement }: { arrangement: Arrangement }) {
  const { then, moreWaiting, ready, moreReady } = arrangement;
  if (then.length === 0 && ready.length === 0) return null;
  return (
    <div className={css.lastLine}>
      {then.length > 0 && (
        <section aria-labelledby="then" className={css.lastLine}>
          <h2 id="then" className={clsx('text-fore-quiet', css.state, css.rowLabel)}>
            Then
          </h2>
          <ol className={clsx(css.codes, css.state)}>
            {then.map((tag) => (
              <Moving key={tag.code} code={tag.code} as="li">
                <span className={clsx(tag.held && clsx('text-fore-quiet', css.heldCode))}>
                  {tag.code}
                  {tag.held && <span className="sr-only"> held</span>}
                </span>
              </Moving>
            ))}
          </ol>
          {moreWaiting > 0 && (
            <p className={clsx('text-fore-quiet', css.state)}>and {moreWaiting} more</p>
          )}
        </section>
      )}
      {ready.length > 0 && (
        <section aria-labelledby="ready" className={css.readyBlock}>
          <h2 id="ready" className={clsx('text-fore-quiet', css.state)}>
            Ready
          </h2>
          <ul className={clsx(css.codes, css.state)}>
            {ready.map((tag) => (
              <Moving key={tag.code} code={tag.code} as="li">
                {tag.code}
                <span className="sr-only"> on {tag.where}</span>
              </Moving>
            ))}
          </ul>
          {moreReady > 0 && <p className={clsx('text-fore-quiet', css.state)}>+{moreReady}</p>}
        </section>
      )}
    </div>
  );
}
