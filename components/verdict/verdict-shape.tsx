import { colours } from '@/components/ui/tokens';
import type { ReactNode } from 'react';
import type { VerdictName } from './verdict';

const shapes: Record<VerdictName, ReactNode> = {
  within: (
    <>
      <circle cx="24" cy="24" r="22" fill={colours.within} />
      <path d="m13 25 8 8 14.5-17" fill="none" stroke={colours.white} strokeWidth="5.5" />
    </>
  ),
  outside: (
    <>
      <path d="M24 1 47 24 24 47 1 24z" fill={colours.outside} />
      <path d="M24 11.5v15.5m0 4v5.5" fill="none" stroke={colours.white} strokeWidth="5.5" />
    </>
  ),
  'too-close': (
    <>
      <path
        d="M12.5 3.5h23L47 24 35.5 44.5h-23L1 24z"
        fill={colours.close}
        stroke={colours['close-text']}
        strokeWidth="2"
        strokeLinejoin="round"
      />
      <path
        d="M11 19.5c4.3-5 8.7-5 13 0s8.7 5 13 0M11 30.5c4.3-5 8.7-5 13 0s8.7 5 13 0"
        fill="none"
        stroke={colours.ink}
        strokeWidth="4"
      />
    </>
  ),
  'not-judged': (
    <rect
      x="4"
      y="4"
      width="40"
      height="40"
      fill="none"
      stroke="var(--fore-quiet)"
      strokeWidth="4"
      strokeDasharray="8 8"
      strokeDashoffset="4"
    />
  ),
};

/** A verdict's shape alone; decorative, so a word must stand beside it. */
export function VerdictShape({ verdict, className }: { verdict: VerdictName; className?: string }) {
  return (
    <svg viewBox="0 0 48 48" className={className} aria-hidden="true" focusable="false">
      {shapes[verdict]}
    </svg>
  );
}
