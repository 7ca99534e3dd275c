import clsx from 'clsx';
import type { CSSProperties } from 'react';
import { PullDots } from '@/components/pull-dots';
import { Tag } from '@/components/tag/tag';
import type { LineBench } from '@/lib/live/contract';
import css from './board.module.css';
import { Moving } from './moving';
import { CAP_PX } from './sizes';

/** Dots beyond this say less than the words beside them. */
const MAX_DOTS = 36;
/** Dots that stand beside a tag in one row. */
const DOTS_A_ROW = 11;

interface BenchTileProps {
  bench: LineBench;
  /** Two rows of benches: the smallest tag that 10 m allow, and no more than its code. */
  isTight: boolean;
}

/** One bench: the tag that hangs there, and how far its check is. */
export function BenchTile({ bench, isTight }: BenchTileProps) {
  const capHeight = `calc(${isTight ? CAP_PX.code : 110} * var(--u))`;
  return (
    <li className={css.bench} aria-label={`Bench ${bench.number}`}>
      {bench.tag ? (
        <Moving code={bench.tag.code} className={css.benchTag}>
          <Tag
            code={bench.tag.code}
            size="board"
            hangs
            capHeight={capHeight}
            line={isTight ? undefined : <ToolLines tool={bench.tag.tool} />}
          />
        </Moving>
      ) : (
        <BarePeg capHeight={capHeight} isTight={isTight} />
      )}
      <div className="flex min-w-0 flex-col">
        <h3 className={clsx('text-fore-quiet', css.state)}>Bench {bench.number}</h3>
        <p className={css.state} data-cap="state">
          {bench.words}
        </p>
        {bench.progress && bench.progress.total <= MAX_DOTS && (
          <span aria-hidden="true" className="mt-3">
            <PullDots
              taken={bench.progress.done}
              total={bench.progress.total}
              size="large"
              perRow={evenRow(bench.progress.total)}
            />
          </span>
        )}
      </div>
    </li>
  );
}

/** 'Click wrench · 60–340 N·m' on two short lines. */
function ToolLines({ tool }: { tool: string }) {
  const [kind, ...rest] = tool.split(' · ');
  return (
    <>
      {kind}
      <br />
      {rest.join(' · ')}
    </>
  );
}

/** Rows of equal length, so that no single dot hangs alone. */
const evenRow = (total: number): number =>
  Math.ceil(total / Math.ceil(Math.max(1, total) / DOTS_A_ROW));

/** Takes the room of a tag, so that nothing jumps when one is hung up. */
function BarePeg({ capHeight, isTight }: { capHeight: string; isTight: boolean }) {
  return (
    <div aria-hidden="true" className={css.benchTag}>
      <div className="tag tag-board tag-hangs" style={{ '--tag-cap': capHeight } as CSSProperties}>
        <div className={clsx('tag-paper', css.shadow)}>
          <span className="tag-code font-code font-bold">A00</span>
          {!isTight && (
            <span className="tag-line">
              <ToolLines tool="Click wrench · 60–340 N·m" />
            </span>
          )}
        </div>
        <span className="tag-peg" />
      </div>
    </div>
  );
}
