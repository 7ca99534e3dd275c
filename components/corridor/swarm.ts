interface SwarmSize {
  plotWidthPx: number;
  dotRadiusPx: number;
  swarmHeightPx: number;
}

/**
 * Vertical offsets, px, that keep dots from hiding one another: each dot in reading order takes
 * the free place nearest the middle line, so that a new reading never moves an earlier one. When
 * the height is full, it takes the place that hides least.
 */
export function swarmOffsets(positions: readonly number[], size: SwarmSize): number[] {
  const candidates = offsetCandidates(size);
  const placed: { x: number; y: number }[] = [];
  for (const position of positions) {
    const x = position * size.plotWidthPx;
    const gap = (y: number) =>
      Math.min(Infinity, ...placed.map((dot) => Math.hypot(dot.x - x, dot.y - y)));
    const free = candidates.find((y) => gap(y) >= size.dotRadiusPx * 1.8);
    const y = free ?? candidates.reduce((best, next) => (gap(next) > gap(best) ? next : best), 0);
    placed.push({ x, y });
  }
  return placed.map((dot) => dot.y);
}

/** Middle first, then ever further, up before down. */
function offsetCandidates({ dotRadiusPx, swarmHeightPx }: SwarmSize): number[] {
  const stepPx = dotRadiusPx / 2;
  const steps = Math.floor(swarmHeightPx / 2 / stepPx);
  return [0, ...Array.from({ length: steps }, (_, index) => (index + 1) * stepPx)].flatMap((y) =>
    y === 0 ? [0] : [-y, y],
  );
}
