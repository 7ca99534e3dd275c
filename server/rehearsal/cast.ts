import type { ToolName } from './tools';

/** Somebody with a tool. Times are minutes before the rehearsal opened. */
export interface Part {
  tool: ToolName;
  joins: number;
  name?: string;
  email?: string;
  /** The visitor takes working points only. */
  workingPoints?: readonly number[];
  /** Leaves the tool with us at joining: it hangs on a peg. */
  leaves?: boolean;
  /** Withdraws on the phone. */
  withdraws?: number;
  /** A lead holds the turn, at this time, for so many minutes. */
  held?: { at: number; minutes: number };
}

/** Everybody of the story, by a word of our own. */
export const CAST = {
  early: { tool: 'click', joins: 172, name: 'Tobin' },
  first: { tool: 'clickLarge', joins: 170, name: 'Mira', email: 'mira@example.org' },
  dial: { tool: 'dial', joins: 168 },
  close: { tool: 'clickFeet', joins: 163, name: 'Edda' },
  worn: { tool: 'clickLarge', joins: 150, name: 'Anselm' },
  working: { tool: 'clickBothWays', joins: 141, name: 'Bryn', workingPoints: [90, 120] },
  preset: { tool: 'preset', joins: 124 },
  electronic: { tool: 'electronic', joins: 118, name: 'Sunniva', email: 'sunniva@example.org' },
  bothWays: { tool: 'clickBothWays', joins: 109, name: 'Caspar' },
  gone: { tool: 'driver', joins: 96, withdraws: 51 },
  short: { tool: 'electronicLarge', joins: 88, name: 'Ottilie' },
  truck: { tool: 'clickTruck', joins: 79, name: 'Garrick' },
  absent: { tool: 'bar', joins: 66 },
  cracked: { tool: 'driverElectronic', joins: 58, name: 'Linus' },
  second: { tool: 'noScale', joins: 50, name: 'Maud' },
  half: { tool: 'click', joins: 44, name: 'Rhona' },
  called: { tool: 'adapter', joins: 41, name: 'Ferris' },
  held: { tool: 'clickLarge', joins: 36, name: 'Isolde', held: { at: 26, minutes: 75 } },
  left: { tool: 'clickFeet', joins: 33, name: 'Jory', leaves: true },
  waitingA: { tool: 'barSet', joins: 29 },
  waitingB: { tool: 'click', joins: 24, name: 'Petra' },
  waitingC: { tool: 'electronicLarge', joins: 18, name: 'Quill' },
  waitingD: { tool: 'dial', joins: 13 },
  waitingE: { tool: 'clickBothWays', joins: 9, name: 'Selwyn', workingPoints: [60, 140] },
  waitingF: { tool: 'clickSmall', joins: 6 },
  waitingG: { tool: 'clickFeet', joins: 3, name: 'Una' },
} as const satisfies Record<string, Part>;

export type Name = keyof typeof CAST;
