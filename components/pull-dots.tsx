import clsx from 'clsx';

interface PullDotsProps {
  taken: number;
  total: number;
  /** What is counted, for screen readers: '9 of 15 readings taken'. */
  noun?: string;
  size?: 'small' | 'large';
  /** Dots a row; all in one wrapping row when left out. */
  perRow?: number;
  className?: string;
}

/** Progress in pulls. Neutral on purpose: a reading taken is not a reading passed. */
export function PullDots({
  taken,
  total,
  noun = 'readings',
  size = 'small',
  perRow,
  className,
}: PullDotsProps) {
  const dots = Array.from({ length: total }, (_, index) => index < taken);
  return (
    <span
      role="img"
      aria-label={`${taken} of ${total} ${noun} taken`}
      className={clsx(
        perRow === undefined ? 'inline-flex flex-wrap' : 'inline-grid',
        size === 'small' ? 'gap-1.5' : 'gap-2',
        className,
      )}
      style={perRow === undefined ? undefined : { gridTemplateColumns: `repeat(${perRow}, auto)` }}
    >
      {dots.map((isTaken, index) => (
        <span
          key={index}
          className={clsx(
            'box-border rounded-full',
            size === 'small' ? 'size-3' : 'size-5.5',
            isTaken ? 'bg-(--dot)' : 'border-2 border-control opacity-70',
          )}
        />
      ))}
    </span>
  );
}
