import { standardNormal, type RandomSource } from './random';

/** The made-up tool behind a simulated tester. */
export interface SimulatedTool {
  /** Mean deviation in per cent of the delivered torque; positive: says more than it delivers. */
  biasPercent: number;
  /** Standard deviation of the deviation, in per cent. */
  scatterPercent: number;
}

/**
 * The torque in N·m that the simulated tool delivers when it says `toolValueNm`. The deviation is
 * ISO 6789's, 100·(x_a − x_r)/x_r, so x_r = x_a / (1 + deviation/100).
 * @throws RangeError when `toolValueNm` is not above 0, or the tool is so far off that the
 * deviation drawn is −100 % or less.
 */
export function simulateDelivered(
  toolValueNm: number,
  tool: SimulatedTool,
  random: RandomSource,
): number {
  if (!Number.isFinite(toolValueNm) || toolValueNm <= 0) {
    throw new RangeError(`A simulated pull needs a torque above 0 N·m, not ${toolValueNm}.`);
  }
  const deviationPercent = tool.biasPercent + tool.scatterPercent * standardNormal(random);
  if (!(deviationPercent > -100)) {
    throw new RangeError(`A deviation of ${deviationPercent} % cannot be simulated.`);
  }
  return toolValueNm / (1 + deviationPercent / 100);
}
