/** What the operator found and confirmed before the first pull; stands on the record. */
export interface AsFound {
  /** The setting at which the tool came in, in its own unit; null when it has none. */
  settingFound: number | null;
  /** Damage seen, in words; empty when none. */
  damage: string;
  battery: 'good' | 'low' | 'none' | 'not-fitted';
  /** Does the tool show zero without load? Null for a tool without a zero. */
  zeroShown: boolean | null;
  /** Which of the tool's scales is checked, in words. */
  scale: string;
  /** Head or adapter fitted, in words. */
  head: string;
  /** The tester's own mode: first peak for setting tools, live for indicating ones. */
  testerMode: 'first-peak' | 'live';
  /** Ambient temperature, °C; null when it was not read. */
  temperatureC: number | null;
}
