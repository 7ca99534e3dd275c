import { describe, expect, it } from 'vitest';
import { openingFault } from './open-port';

describe('openingFault', () => {
  it.each([
    ['Error: No such file or directory, cannot open /dev/x', 'There is no tester at /dev/x.'],
    ['Opening COM3: File not found', 'There is no tester at /dev/x.'],
    ['Error: Permission denied, cannot open /dev/x', 'may not be opened by this account'],
    ['Error Resource temporarily unavailable Cannot lock port', 'in use by another program'],
    ['Error: Device or resource busy, cannot open /dev/x', 'in use by another program'],
    ['Opening COM3: Access denied', 'in use by another program'],
    ['Error: Is a directory, cannot open /dev/x', 'is not a serial port'],
    ['Error: Input/output error, cannot open /dev/x', '(Input/output error, cannot open /dev/x)'],
  ])('%s', (text, words) => {
    expect(openingFault('/dev/x', new Error(text))).toContain(words);
  });
});
