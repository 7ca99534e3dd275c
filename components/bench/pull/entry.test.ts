import { describe, expect, it } from 'vitest';
import { checkView, pullView, stepView } from '../fixtures';
import { entryNeeds, readEntry } from './entry';

const exercise = stepView({ kind: 'exercise' });
const offered = pullView({ state: 'offered' });

describe('entryNeeds', () => {
  it('asks for the tester’s value when it is typed, and for the display of an indicating tool', () => {
    expect(entryNeeds(checkView(), true)).toMatchObject({ value: true, toolValue: false });
    expect(entryNeeds(checkView({ setting: false }), true)).toMatchObject({
      value: true,
      toolValue: true,
    });
  });

  it('waits for the tester when it sends its values itself', () => {
    expect(entryNeeds(checkView(), false)).toBeNull();
    expect(entryNeeds(checkView({ offered }), false)).toMatchObject({
      value: false,
      toolValue: false,
      verb: 'accept',
    });
    expect(entryNeeds(checkView({ offered, setting: false }), false)).toMatchObject({
      toolValue: true,
    });
  });

  it('asks for nothing at an exercise pull', () => {
    for (const types of [true, false]) {
      expect(entryNeeds(checkView({ step: exercise }), types)).toEqual({
        value: false,
        toolValue: false,
        mayBeEmpty: true,
        verb: 'done',
      });
    }
  });

  it('asks for nothing when nothing is due', () => {
    expect(entryNeeds(checkView({ step: null }), true)).toBeNull();
  });
});

describe('readEntry', () => {
  const needs = { value: true, toolValue: true, mayBeEmpty: false, verb: 'take' as const };

  it('reads a point and a comma', () => {
    expect(readEntry({ value: '201,6', toolValue: '204.0' }, needs)).toEqual({
      numbers: { value: 201.6, toolValue: 204 },
    });
  });

  it('says what is wrong with each field, and looks at no tolerance', () => {
    expect(readEntry({ value: 'two', toolValue: '' }, needs)).toEqual({
      errors: {
        value: 'This is no number.',
        toolValue: 'Type this value.',
      },
    });
    expect(readEntry({ value: '-3', toolValue: '204' }, needs)).toEqual({
      errors: { value: 'A torque is not negative.' },
    });
    expect(readEntry({ value: '2040', toolValue: '204' }, needs)).toHaveProperty('numbers');
  });
});
