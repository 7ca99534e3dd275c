import { describe, expect, it } from 'vitest';
import { conformanceProbability, testUncertaintyRatio } from './conformance';
import { delivered } from './delivered';
import { extensionTorque } from './extension';

const points = [
  { settingNm: 340, meanNm: 345, expandedNm: 2 },
  { settingNm: 68, meanNm: 66, expandedNm: 1 },
  { settingNm: 204, meanNm: 204, expandedNm: 1.5 },
];

describe('delivered', () => {
  it('is the tested mean at a tested setting', () => {
    expect(delivered(points, 68)).toEqual({ valueNm: 66, expandedNm: 1 });
    expect(delivered(points, 340)).toEqual({ valueNm: 345, expandedNm: 2 });
  });
  it('is linear in between and null beyond', () => {
    expect(delivered(points, 136)).toEqual({ valueNm: 135, expandedNm: 1.25 });
    expect(delivered(points, 67)).toBeNull();
    expect(delivered(points, 0)).toBeNull();
    expect(delivered(points, 341)).toBeNull();
  });
  it('one point tells of itself only', () => {
    expect(delivered(points.slice(0, 1), 340)?.valueNm).toBe(345);
    expect(delivered(points.slice(0, 1), 339)).toBeNull();
  });
  it('refuses no points, two at one setting, and no torque', () => {
    expect(() => delivered([], 100)).toThrow(RangeError);
    expect(() => delivered([...points, ...points], 100)).toThrow(RangeError);
    expect(() => delivered(points, Number.NaN)).toThrow(RangeError);
    expect(() => delivered(points, -1)).toThrow(RangeError);
  });
});

describe('extensionTorque', () => {
  it('is the setting itself without an extension, and less for one that points back', () => {
    expect(extensionTorque({ settingNm: 60, lengthM: 0.4, extensionM: 0 })).toBe(60);
    expect(extensionTorque({ settingNm: 60, lengthM: 0.4, extensionM: -0.1 })).toBeCloseTo(45, 12);
  });
  it('refuses impossible lengths', () => {
    expect(() => extensionTorque({ settingNm: 60, lengthM: 0, extensionM: 0.1 })).toThrow(
      RangeError,
    );
    expect(() => extensionTorque({ settingNm: 60, lengthM: 0.4, extensionM: -0.4 })).toThrow(
      RangeError,
    );
    expect(() => extensionTorque({ settingNm: -1, lengthM: 0.4, extensionM: 0 })).toThrow(
      RangeError,
    );
  });
});

describe('conformanceProbability', () => {
  it('is a half on a limit, and whole without limits', () => {
    expect(conformanceProbability({ value: 4, standard: 0.1, upper: 4 })).toBeCloseTo(0.5, 12);
    expect(conformanceProbability({ value: 4, standard: 0.1 })).toBe(1);
  });
  it('is yes or no without uncertainty', () => {
    const limits = { lower: -4, upper: 4 };
    expect(conformanceProbability({ value: 4, standard: 0, ...limits })).toBe(1);
    expect(conformanceProbability({ value: 4.1, standard: 0, ...limits })).toBe(0);
  });
  it('refuses bad input', () => {
    expect(() => conformanceProbability({ value: 0, standard: -1 })).toThrow(RangeError);
    expect(() => conformanceProbability({ value: Number.NaN, standard: 1 })).toThrow(RangeError);
    expect(() => conformanceProbability({ value: 0, standard: 1, upper: Number.NaN })).toThrow(
      RangeError,
    );
    expect(() => conformanceProbability({ value: 0, standard: 1, lower: 1, upper: 0 })).toThrow(
      RangeError,
    );
  });
});

describe('testUncertaintyRatio', () => {
  it('goes by the smaller limit', () => {
    expect(testUncertaintyRatio({ lower: -4, upper: 4 }, 1)).toBe(4);
    expect(testUncertaintyRatio({ lower: -2, upper: 6 }, 0.5)).toBe(4);
    expect(testUncertaintyRatio({ lower: -4, upper: 4 }, 0)).toBe(Infinity);
    expect(() => testUncertaintyRatio({ lower: -4, upper: 4 }, -1)).toThrow(RangeError);
  });
});
