import { describe, expect, it } from 'vitest';
import { comboOf, isCommand, keyWords } from './keys';

const press = (key: string, modifiers: Partial<Parameters<typeof comboOf>[0]> = {}) =>
  comboOf({ key, ctrlKey: false, metaKey: false, altKey: false, ...modifiers });

describe('comboOf', () => {
  it('names keys without regard to case, and leaves the browser its own', () => {
    expect(press('V')).toBe('v');
    expect(press('?')).toBe('?');
    expect(press('Enter', { ctrlKey: true })).toBe('ctrl+enter');
    expect(press('Enter', { metaKey: true })).toBe('ctrl+enter');
    expect(press('l', { ctrlKey: true })).toBeNull();
    expect(press('v', { altKey: true })).toBeNull();
  });
});

describe('isCommand', () => {
  it('never takes a letter out of a text', () => {
    expect(isCommand('v', 'typing')).toBe(false);
    expect(isCommand('?', 'typing')).toBe(false);
    expect(isCommand('escape', 'typing')).toBe(true);
    expect(isCommand('ctrl+enter', 'typing')).toBe(true);
  });

  it('takes letters beside a number, and leaves it its digits and its Enter', () => {
    expect(isCommand('v', 'number')).toBe(true);
    for (const key of ['4', '.', ',', '-', 'enter']) expect(isCommand(key, 'number')).toBe(false);
  });

  it('leaves Enter and the space bar to a button that has the focus', () => {
    expect(isCommand('enter', 'control')).toBe(false);
    expect(isCommand(' ', 'control')).toBe(false);
    expect(isCommand('4', 'control')).toBe(true);
    expect(isCommand('enter', 'page')).toBe(true);
  });
});

describe('keyWords', () => {
  it('prints what stands on the key', () => {
    expect(['enter', 'escape', 'v', '?', 'ctrl+enter'].map(keyWords)).toEqual([
      'Enter',
      'Esc',
      'V',
      '?',
      'Ctrl+Enter',
    ]);
  });
});
