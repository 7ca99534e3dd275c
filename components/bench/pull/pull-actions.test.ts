import { describe, expect, it } from 'vitest';
import { checkView, pullView, stepView } from '../fixtures';
import { entryNeeds } from './entry';
import { pullActions } from './pull-actions';

type Input = Parameters<typeof pullActions>[0];

function actionsOf(values: Partial<Input> = {}) {
  const opened: unknown[] = [];
  const check = values.check ?? checkView();
  const actions = pullActions({
    check,
    needs: entryNeeds(check, true),
    entry: {
      doubt: null,
      submit: () => undefined,
      retype: () => undefined,
      pending: false,
      unanswered: false,
      text: { value: '', toolValue: '' },
    },
    isSimulated: false,
    sendsItself: false,
    typesInstead: false,
    busy: false,
    open: (panel) => void opened.push(panel),
    onPause: () => undefined,
    onSimulate: () => undefined,
    onTypeInstead: () => undefined,
    ...values,
  });
  const at = (key: string) => actions.find((action) => action.key === key);
  return { at, opened, keys: actions.map(({ key }) => key) };
}

describe('pullActions', () => {
  it('gives each key one meaning, and each action its button', () => {
    const { keys, at } = actionsOf();
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys).toEqual(['enter', 'v', 'r', 'n', 'p', 'escape', 'a', '?']);
    expect(keys.every((key) => !at(key)?.keyOnly)).toBe(true);
  });

  it('asks about a release only at a reading of a setting tool', () => {
    expect(actionsOf({ check: checkView({ setting: false }) }).at('r')).toBeUndefined();
    const exercise = checkView({ step: stepView({ kind: 'exercise' }) });
    expect(actionsOf({ check: exercise }).at('r')).toBeUndefined();
    const offered = checkView({ offered: pullView({ state: 'offered' }) });
    expect(actionsOf({ check: offered }).at('r')).toMatchObject({ label: 'did not let go' });
  });

  it('lets go of what is typed before Esc stops anything', () => {
    const { opened, at } = actionsOf();
    at('escape')?.run();
    expect(opened).toEqual([{ kind: 'stop' }]);
    const entry = {
      doubt: null,
      submit: () => undefined,
      retype: () => undefined,
      pending: false,
      unanswered: false,
      text: { value: '20', toolValue: '' },
    };
    expect(actionsOf({ entry }).at('escape')?.label).toBe('retype');
    const doubted = { ...entry, doubt: 'Wrong scale?', text: { value: '', toolValue: '' } };
    expect(actionsOf({ entry: doubted }).at('escape')?.label).toBe('retype');
  });

  it('offers a simulated pull and typing only where the tester sends its values', () => {
    const own = actionsOf({ sendsItself: true, isSimulated: true });
    expect(own.keys).toContain('s');
    expect(own.keys).toContain('t');
    expect(actionsOf({ sendsItself: true }).keys).not.toContain('s');
  });

  it('goes on with Enter while paused, and plays no pull while one waits', () => {
    const paused = actionsOf({ check: checkView({ paused: true }) });
    expect(paused.keys.filter((key) => key === 'enter')).toHaveLength(1);
    expect(paused.at('enter')?.label).toBe('go on');
    const check = checkView({ offered: pullView({ state: 'offered' }) });
    expect(actionsOf({ check, sendsItself: true, isSimulated: true }).at('s')?.disabled).toBe(true);
  });

  it('has nothing to void when every pull is void', () => {
    const check = checkView({ pulls: [pullView({ state: 'voided' })] });
    expect(actionsOf({ check }).at('v')?.disabled).toBe(true);
  });
});
