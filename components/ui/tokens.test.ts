import { describe, expect, it } from 'vitest';
import { colours, type ColourName } from './tokens';

/** Relative luminance, WCAG 2.2. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((start) => {
    const channel = parseInt(hex.slice(start, start + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(first: string, second: string): number {
  const [light = 0, dark = 0] = [luminance(first), luminance(second)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

const on = (text: ColourName, ground: ColourName) => contrast(colours[text], colours[ground]);

describe('contrast of the tokens', () => {
  it('measures the published pairs', () => {
    // WCAG 2.2: #767676 on white 4.54, #595959 7.00
    expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
    expect(contrast('#595959', '#ffffff')).toBeCloseTo(7.0, 2);
  });

  it.each([
    ['ink', 'chalk'],
    ['ink', 'manila-deep'],
    ['ink', 'signal'],
    ['ink-quiet', 'chalk'],
    ['ink-soft', 'manila'],
    ['ink-soft', 'manila-deep'],
    ['wall-text', 'wall'],
  ] as const)('%s on %s is at least 7:1', (text, ground) => {
    expect(on(text, ground)).toBeGreaterThanOrEqual(7);
  });

  it.each([
    ['wall-quiet', 'wall'],
    ['within-text', 'chalk'],
    ['outside-text', 'chalk'],
    ['close-text', 'chalk'],
  ] as const)('%s on %s is at least 4.5:1', (text, ground) => {
    expect(on(text, ground)).toBeGreaterThanOrEqual(4.5);
  });

  it.each([
    ['edge', 'chalk'],
    ['edge', 'manila-deep'],
    ['within', 'chalk'],
    ['outside', 'band'],
    ['within', 'wall'],
    ['outside', 'wall'],
  ] as const)('the shape %s on %s is at least 3:1', (shape, ground) => {
    expect(on(shape, ground)).toBeGreaterThanOrEqual(3);
  });
});
