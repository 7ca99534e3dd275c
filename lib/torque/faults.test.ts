import { describe, expect, it } from 'vitest';
import { mayVoid, needsConfirmation, VOID_FAULT_LABELS, VOID_FAULTS } from './faults';
import { stopTorque } from './stop';

describe('mayVoid', () => {
  it('an operator voids two at a point, a lead and an owner more', () => {
    const may = (voidedAtPoint: number, role: 'operator' | 'lead' | 'owner') =>
      mayVoid({ voidedAtPoint, role });
    expect([0, 1, 2, 3].map((count) => may(count, 'operator'))).toEqual([true, true, false, false]);
    expect(may(2, 'lead')).toBe(true);
    expect(may(7, 'owner')).toBe(true);
    expect(() => may(-1, 'lead')).toThrow(RangeError);
  });
  it('every fault has its words', () => {
    expect(Object.keys(VOID_FAULT_LABELS).sort()).toEqual([...VOID_FAULTS].sort());
  });
});

describe('needsConfirmation', () => {
  const reason = (valueNm: number) => needsConfirmation({ valueNm, targetNm: 100 })?.reason ?? null;
  it.each([135.6, 73.8, 1200, 8.33, 130, 141])('%d for 100 asks for the scale', (value) => {
    expect(reason(value)).toBe('wrong-scale');
  });
  it.each([200, 1000, 50, 10, 0])('%d for 100 is far', (value) => {
    expect(reason(value)).toBe('far');
  });
  it.each([100, 96, 104, 90, 120, 85])('%d for 100 is taken', (value) => {
    expect(reason(value)).toBeNull();
  });
  it('goes by the ratio alone', () => {
    for (const scale of [0.01, 3, 1e4]) {
      const answer = needsConfirmation({ valueNm: 1.356 * scale, targetNm: scale });
      expect(answer?.reason).toBe('wrong-scale');
    }
  });
  it('refuses what is no torque', () => {
    expect(() => needsConfirmation({ valueNm: -1, targetNm: 100 })).toThrow(RangeError);
    expect(() => needsConfirmation({ valueNm: 1, targetNm: 0 })).toThrow(RangeError);
  });
});

describe('stopTorque', () => {
  it('is the first of the three that is reached', () => {
    const stop = (targetNm: number) => stopTorque({ targetNm, toolMaxNm: 340, testerMaxNm: 405 });
    expect(stop(200)).toBe(260);
    expect(stop(340)).toBe(405);
    expect(stopTorque({ targetNm: 340, toolMaxNm: 340, testerMaxNm: 1000 })).toBe(408);
  });
  it('refuses what is no torque', () => {
    expect(() => stopTorque({ targetNm: 0, toolMaxNm: 1, testerMaxNm: 1 })).toThrow(RangeError);
    expect(() => stopTorque({ targetNm: 1, toolMaxNm: 1, testerMaxNm: Number.NaN })).toThrow(
      RangeError,
    );
  });
});
