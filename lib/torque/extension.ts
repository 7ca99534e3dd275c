import { finite, notNegative, positive } from './assert';

/**
 * Torque at the end of an extension in line with the tool, N·m: setting × (length + extension) /
 * length. `lengthM` runs from the tool's drive to the middle of the grip, `extensionM` from the
 * drive to the fastener; below zero it points back along the handle.
 * @throws {RangeError} for a negative setting, a length that is not above zero, or an extension that
 * reaches the grip.
 */
export function extensionTorque(options: {
  settingNm: number;
  lengthM: number;
  extensionM: number;
}): number {
  const settingNm = notNegative(options.settingNm, 'The setting');
  const lengthM = positive(options.lengthM, 'The length of the tool');
  const extensionM = finite(options.extensionM, 'The length of the extension');
  if (lengthM + extensionM <= 0) {
    throw new RangeError('An extension pointing back must end before the grip.');
  }
  return (settingNm * (lengthM + extensionM)) / lengthM;
}
