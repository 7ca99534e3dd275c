/**
 * The colours of the workshop wall, by name. Tailwind's theme and every drawing that cannot use a
 * class (SVG, print) read them from here. Verdict colours: the published Okabe-Ito palette.
 */
export const colours = {
  wall: '#26302e',
  'wall-deep': '#222b29',
  hole: '#141b19',
  'wall-text': '#f3eddc',
  'wall-quiet': '#b3b8aa',
  chalk: '#faf6ec',
  /** Grounds of inputs and keys, and marks inside verdict shapes. */
  white: '#ffffff',
  rule: '#d8ccae',
  /** Edges of inputs and empty dots: at least 3:1 on chalk and on manila, unlike `rule`. */
  edge: '#7a6f55',
  manila: '#f6e7c1',
  'manila-deep': '#eed9a8',
  ring: '#b98f4e',
  ink: '#1b1a17',
  'ink-quiet': '#5a5344',
  /** Quiet ink dark enough for 7:1 on the deep end of manila. */
  'ink-soft': '#463f30',
  signal: '#ffb81c',
  band: '#f1e9d4',
  guard: '#efe5cb',
  'guard-line': '#9b8f74',
  within: '#009e73',
  'within-text': '#006b4f',
  outside: '#d55e00',
  'outside-text': '#a34700',
  close: '#56b4e9',
  'close-text': '#0a5c8f',
  unjudged: '#5a5344',
} as const;

export type ColourName = keyof typeof colours;
