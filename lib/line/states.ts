/** The eight states of a tag. */
export const TAG_STATES = [
  'waiting',
  'called',
  'on_bench',
  'ready',
  'returned',
  'away',
  'withdrawn',
  'unfit',
] as const;
export type TagState = (typeof TAG_STATES)[number];

/** Where the tool itself is. A fact apart from the state. */
export const TAG_PLACES = ['visitor', 'peg', 'bench', 'returned'] as const;
export type TagPlace = (typeof TAG_PLACES)[number];

/** What a visitor agreed to at joining. */
export const CONSENTS = ['maximum', 'working'] as const;
export type Consent = (typeof CONSENTS)[number];

export const BENCH_STATES = ['open', 'paused', 'closed'] as const;
export type BenchState = (typeof BENCH_STATES)[number];

/** A check is running until it is signed, or abandoned. A pause is kept apart, as a time. */
export const CHECK_STATES = ['running', 'signed', 'abandoned'] as const;
export type CheckState = (typeof CHECK_STATES)[number];

export const PULL_SOURCES = ['keyed', 'simulated', 'serial'] as const;
export type PullSource = (typeof PULL_SOURCES)[number];

export const PROOF_METHODS = ['dead-weight', 'comparison'] as const;
export type ProofMethod = (typeof PROOF_METHODS)[number];

export const ROLES = ['operator', 'lead', 'owner'] as const;
export type Role = (typeof ROLES)[number];
