/** One thing that can be done now: a key of the keyboard and a button in the key bar. */
export interface BenchAction {
  /** As `comboOf` names it: 'enter', 'ctrl+enter', 'escape', 'v', '?'. */
  key: string;
  /** What it does, beside the key. */
  label: string;
  run: () => void;
  disabled?: boolean;
  /** Bound to its key, but shown by another button of the screen. */
  keyOnly?: boolean;
  /** At the right end of the bar. */
  atEnd?: boolean;
}

/** The part of a keyboard event that decides. */
export interface KeyPress {
  key: string;
  ctrlKey: boolean;
  metaKey: boolean;
  altKey: boolean;
}

/** Where the focus is when the key is pressed. */
export type FocusKind =
  /** The page itself, a heading, a panel. */
  | 'page'
  /** Has its own use for Enter and the space bar. */
  | 'control'
  /** Text is being typed. */
  | 'typing'
  /** A number is being typed: letters are no part of it and stay commands. */
  | 'number';

/** The name of a key press; null for one that is the browser's (Ctrl+L, Alt+F). */
export function comboOf(press: KeyPress): string | null {
  const key = press.key.toLowerCase();
  if (press.altKey) return null;
  if (press.ctrlKey || press.metaKey) return key === 'enter' ? 'ctrl+enter' : null;
  return key;
}

/** May this key be a command where the focus is? */
export function isCommand(combo: string, focus: FocusKind): boolean {
  if (combo === 'escape' || combo === 'ctrl+enter') return true;
  if (focus === 'page') return true;
  if (focus === 'typing') return false;
  if (combo === 'enter' || combo === ' ') return false;
  return focus === 'control' || !/^[0-9.,+-]$/.test(combo);
}

const KEY_WORDS: Record<string, string> = {
  enter: 'Enter',
  'ctrl+enter': 'Ctrl+Enter',
  escape: 'Esc',
  arrowleft: '←',
  arrowright: '→',
};

/** As it is printed on the key. */
export const keyWords = (key: string): string => KEY_WORDS[key] ?? key.toUpperCase();
