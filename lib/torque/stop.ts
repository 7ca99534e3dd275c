import { positive } from './assert';

/**
 * The torque at which a pull of a setting tool that has not let go is stopped, N·m: 130 % of the
 * target, 120 % of the tool's maximum or the tester's maximum, whichever comes first.
 * @throws {RangeError} for torques that are not above zero.
 */
export function stopTorque(options: {
  targetNm: number;
  toolMaxNm: number;
  testerMaxNm: number;
}): number {
  return Math.min(
    1.3 * positive(options.targetNm, 'The target'),
    1.2 * positive(options.toolMaxNm, 'The tool’s maximum'),
    positive(options.testerMaxNm, 'The tester’s maximum'),
  );
}
