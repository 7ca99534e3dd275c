/** The four verdicts, as the computation names them. */
export type VerdictName = 'within' | 'outside' | 'too-close' | 'not-judged';

/** A verdict's word for a place in a list or a line. */
export const verdictWord: Record<VerdictName, string> = {
  within: 'Within',
  outside: 'Outside',
  'too-close': 'Too close to call',
  'not-judged': 'Not judged',
};

/** A verdict's words as the heading of a full check; a short check says more (`words`). */
export const verdictHeadline: Record<VerdictName, string> = {
  within: 'Within tolerance',
  outside: 'Outside tolerance',
  'too-close': 'Too close to call',
  'not-judged': 'Not judged',
};
