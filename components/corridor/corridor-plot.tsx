import { colours } from '@/components/ui/tokens';
import type { CorridorMark, CorridorMetrics, CorridorRowLayout } from './geometry';

const percent = (fraction: number) => `${(fraction * 100).toFixed(2)}%`;

/** Share of the row's height at which the dots' middle line and the mean bar stand. */
const dotsAt = '40%';
const meanAt = '82%';

interface CorridorPlotProps {
  layout: CorridorRowLayout;
  metrics: CorridorMetrics;
  /** Id of the hatch drawn by `GuardHatch`. */
  hatchId: string;
  /** Shown, not counted: hollow dots and a paler band. */
  excluded: boolean;
}

/**
 * One row's drawing. Positions across are per cents of its width and sizes are pixels, so it
 * stretches without distorting dots or lines.
 */
export function CorridorPlot({ layout, metrics, hatchId, excluded }: CorridorPlotProps) {
  const { band, guards, limits, marks, mean } = layout;
  return (
    <svg aria-hidden="true" focusable="false">
      {band && (
        <rect
          {...spanX(band)}
          y="0"
          height="100%"
          fill={colours.band}
          opacity={excluded ? 0.5 : 1}
        />
      )}
      {guards.map((guard, index) => (
        <rect key={index} {...spanX(guard)} y="0" height="100%" fill={`url(#${hatchId})`} />
      ))}
      <Upright at={0.5} width={1} />
      {limits.map((limit) => (
        <Upright key={limit.value} at={limit.at} width={2.5} />
      ))}
      {mean && (
        <g stroke="var(--fore)" strokeWidth="2.5">
          <line x1={percent(mean.from)} x2={percent(mean.to)} y1={meanAt} y2={meanAt} />
          <svg x={percent(mean.at)} y={meanAt} overflow="visible">
            {mean.pastEdge === null ? (
              <line y1="-6" y2="6" />
            ) : (
              <path d={arrow(mean.pastEdge, 5)} fill="var(--fore)" stroke="none" />
            )}
          </svg>
        </g>
      )}
      {marks.map((mark, index) => (
        <svg key={index} x={percent(mark.at)} y={dotsAt} overflow="visible">
          <Mark mark={mark} radiusPx={metrics.dotRadiusPx} hollow={excluded} />
        </svg>
      ))}
    </svg>
  );
}

/** A reading: a dot; beyond a limit a square on its corner; past the axis an arrow. */
function Mark({
  mark,
  radiusPx,
  hollow,
}: {
  mark: CorridorMark;
  radiusPx: number;
  hollow: boolean;
}) {
  const fill = mark.beyond ? colours.outside : colours.ink;
  const paint = hollow
    ? { fill: colours.chalk, stroke: fill, strokeWidth: 2 }
    : { fill, stroke: colours.chalk, strokeWidth: 1 };
  const y = mark.offsetPx;
  if (mark.pastEdge !== null) {
    return <path d={arrow(mark.pastEdge, radiusPx)} transform={`translate(0 ${y})`} {...paint} />;
  }
  if (!mark.beyond) return <circle cy={y} r={radiusPx} {...paint} />;
  const reach = radiusPx * 1.3;
  return (
    <path
      d={`M0 ${y - reach}l${reach} ${reach}l${-reach} ${reach}l${-reach} ${-reach}z`}
      {...paint}
    />
  );
}

function Upright({ at, width }: { at: number; width: number }) {
  return (
    <line
      x1={percent(at)}
      x2={percent(at)}
      y1="0"
      y2="100%"
      stroke="var(--fore)"
      strokeWidth={width}
    />
  );
}

/** A triangle of the given half height that points out of the plot. */
function arrow(side: 'left' | 'right', half: number): string {
  const tip = side === 'left' ? -half * 1.2 : half * 1.2;
  return `M${tip} 0L${-tip} ${-half * 1.2}V${half * 1.2}z`;
}

function spanX({ from, to }: { from: number; to: number }) {
  return { x: percent(from), width: percent(to - from) };
}

/** The hatch of the guard zones, once a corridor. */
export function GuardHatch({ id }: { id: string }) {
  return (
    <svg width="0" height="0" className="absolute" aria-hidden="true" focusable="false">
      <pattern
        id={id}
        width="6"
        height="6"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <rect width="6" height="6" fill={colours.guard} />
        <rect width="2" height="6" fill={colours['guard-line']} />
      </pattern>
    </svg>
  );
}
