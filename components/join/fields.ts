/** The names of the join form's fields; each is also the id of its control. */
export const JOIN_FIELDS = [
  'commandId',
  'meetId',
  'ticket',
  'kind',
  'rangeMin',
  'rangeMax',
  'unit',
  'nominal',
  'consent',
  'workingPoints',
  'drive',
  'claimPercent',
  'claimOf',
  'claimCcwPercent',
  'ownPoints',
  'measuresCcw',
  'division',
  'maker',
  'serial',
  'name',
  'email',
  'mobile',
] as const;
export type JoinField = (typeof JOIN_FIELDS)[number];

/** Everything as it was typed; a field that was not sent is ''. */
export type JoinValues = Record<JoinField, string>;

/** What the form shows after it was sent and refused. */
export interface JoinState {
  values: JoinValues;
  /** What is wrong with a field, in words. */
  errors: Partial<Record<JoinField, string>>;
  /** What is wrong with the whole, in words; null when nothing is. */
  message: string | null;
  /** Set when this form has been used up: the next try goes under this id. */
  commandId: string | null;
  /** Counts the answers, so that each one is announced. */
  attempt: number;
}

/** A field's words, as the list of what is wrong names it. */
export const JOIN_LABELS: Partial<Record<JoinField, string>> = {
  kind: 'Kind of tool',
  rangeMin: 'Range from',
  rangeMax: 'Range to',
  unit: 'Unit',
  nominal: 'Preset value',
  consent: 'How it may be pulled',
  workingPoints: 'Working torques',
  drive: 'Drive size',
  claimPercent: 'Maker’s claim',
  claimOf: 'Maker’s claim',
  claimCcwPercent: 'Claim counter-clockwise',
  ownPoints: 'Working torques',
  division: 'Scale division',
  maker: 'Maker',
  serial: 'Serial number',
  name: 'Name',
  email: 'Mail',
  mobile: 'Mobile',
};

/** A form that nobody has touched. */
export const emptyJoin = (): JoinState => ({
  values: Object.fromEntries(JOIN_FIELDS.map((field) => [field, ''])) as JoinValues,
  errors: {},
  message: null,
  commandId: null,
  attempt: 0,
});
