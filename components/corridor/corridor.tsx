import clsx from 'clsx';
import { Fragment, useId } from 'react';
import { CorridorAxis } from './corridor-axis';
import { CorridorPlot, GuardHatch } from './corridor-plot';
import { CorridorTable } from './corridor-table';
import { layoutCorridor, type CorridorMetrics } from './geometry';
import type { CorridorBasis, CorridorRow } from './types';
import { corridorDescription, directionWord, rowName, signedPercent } from './words';

export type { CorridorBasis, CorridorReading, CorridorRow } from './types';

export type CorridorSize = 'compact' | 'roomy';

const metricsOf: Record<CorridorSize, CorridorMetrics> = {
  // The phone's plot at 320 px wide; the bench's at 1366.
  compact: { plotWidthPx: 150, dotRadiusPx: 4.5, swarmHeightPx: 32 },
  roomy: { plotWidthPx: 480, dotRadiusPx: 6, swarmHeightPx: 46 },
};

interface CorridorProps {
  rows: readonly CorridorRow[];
  basis: CorridorBasis;
  size?: CorridorSize;
  /** Names the chart for screen readers. */
  title?: string;
  className?: string;
}

/** The one chart of the product: a row a set point, tolerance, guard, readings and mean. */
export function Corridor({
  rows,
  basis,
  size = 'compact',
  title = 'Deviation at each set point',
  className,
}: CorridorProps) {
  const id = useId();
  const metrics = metricsOf[size];
  const layout = layoutCorridor(rows, basis, metrics);
  const isTurning = rows.some((row) => row.direction === 'ccw');
  const first = layout.rows[0];
  return (
    <figure className={clsx('ground-chalk relative', className)}>
      <GuardHatch id={`${id}hatch`} />
      <div
        role="img"
        aria-label={title}
        aria-describedby={`${id}words`}
        className={clsx('corridor', `corridor-${size}`)}
      >
        <Sides size={size} />
        {layout.rows.map((rowLayout, index) => {
          const row = rows[index];
          if (row === undefined) return null;
          const startsDirection = isTurning && row.direction !== rows[index - 1]?.direction;
          return (
            <Fragment key={rowName(row)}>
              {startsDirection && row.direction && (
                <div className="corridor-heading font-semibold first-letter:uppercase">
                  {directionWord(row.direction)}
                </div>
              )}
              <div className="corridor-row">
                <Name row={row} size={size} />
                <div className="corridor-cell corridor-plot">
                  <CorridorPlot
                    layout={rowLayout}
                    metrics={metrics}
                    hatchId={`${id}hatch`}
                    excluded={row.excluded ?? false}
                  />
                </div>
                <Figures row={row} size={size} />
              </div>
              {!layout.sharedLimits && <CorridorAxis limits={rowLayout.limits} hasZero={false} />}
            </Fragment>
          );
        })}
        {layout.sharedLimits && first && <CorridorAxis limits={first.limits} hasZero />}
      </div>
      <p id={`${id}words`} className="sr-only">
        {corridorDescription(rows, basis)}
      </p>
      <CorridorTable rows={rows} caption={title} />
    </figure>
  );
}

function Sides({ size }: { size: CorridorSize }) {
  return (
    <div
      className={clsx(
        'corridor-sides text-fore-quiet',
        size === 'roomy' ? 'text-base' : 'text-[0.8rem]',
      )}
    >
      <span>delivers less</span>
      <span>more</span>
    </div>
  );
}

function Name({ row, size }: { row: CorridorRow; size: CorridorSize }) {
  const isRoomy = size === 'roomy';
  return (
    <div className="corridor-cell corridor-name" data-current={row.current ?? false}>
      <span className={clsx(isRoomy && 'flex items-baseline gap-2')}>
        <span
          className={clsx(
            'font-code block leading-none font-semibold',
            isRoomy ? 'text-4xl' : 'text-2xl',
            row.excluded && 'text-fore-quiet',
          )}
        >
          {row.label}
        </span>
        <span className={clsx('text-fore-quiet', !isRoomy && 'text-[0.85rem]')}>
          {row.unitLabel}
        </span>
      </span>
    </div>
  );
}

function Figures({ row, size }: { row: CorridorRow; size: CorridorSize }) {
  const words = row.excluded ? 'not counted' : row.words;
  return (
    <div className="corridor-cell corridor-figures">
      {row.mean !== null && (
        <span className={clsx('font-reading whitespace-nowrap', size === 'roomy' && 'text-2xl')}>
          {signedPercent(row.mean, 1)}
        </span>
      )}
      {words && (
        <span
          className={clsx(
            'text-fore-quiet',
            size === 'roomy' ? 'text-base' : 'max-w-19 text-[0.8rem] text-balance',
          )}
        >
          {words}
        </span>
      )}
    </div>
  );
}
