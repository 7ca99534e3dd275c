export interface QrDrawing {
  /** Modules a side, without the quiet zone. */
  modules: number;
  /** SVG path of the dark modules, one unit each. */
  path: string;
}

/** A QR code in ink on white, with its quiet zone of four modules. */
export function QrCode({
  drawing,
  label,
  quiet = 4,
  className,
}: {
  drawing: QrDrawing;
  label: string;
  quiet?: number;
  className?: string | undefined;
}) {
  const side = drawing.modules + 2 * quiet;
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`${-quiet} ${-quiet} ${side} ${side}`}
      preserveAspectRatio="xMinYMin meet"
      shapeRendering="crispEdges"
      className={className}
    >
      <path d={`M${-quiet} ${-quiet}h${side}v${side}h${-side}z`} fill="#fff" />
      <path d={drawing.path} fill="#1b1a17" />
    </svg>
  );
}
