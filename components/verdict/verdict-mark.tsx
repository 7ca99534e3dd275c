import clsx from 'clsx';
import type { ReactNode } from 'react';
import { verdictHeadline, verdictWord, type VerdictName } from './verdict';
import { VerdictShape } from './verdict-shape';

export type { VerdictName } from './verdict';

interface VerdictMarkProps {
  verdict: VerdictName;
  /** Words beside the shape, where the plain word would say too much (a short check). */
  words?: ReactNode;
  size?: 'small' | 'normal' | 'large';
  className?: string;
}

const shapeClass = { small: 'size-4.5', normal: 'size-7', large: 'size-12' };
const wordClass = { small: '', normal: 'font-semibold', large: 'text-2xl font-bold' };

/** A verdict in a line: its shape and its word, never the colour alone. */
export function VerdictMark({ verdict, words, size = 'normal', className }: VerdictMarkProps) {
  return (
    <span className={clsx('inline-flex items-center gap-2', className)}>
      <VerdictShape verdict={verdict} className={clsx('shrink-0', shapeClass[size])} />
      <span className={clsx('leading-tight', wordClass[size])}>
        {words ?? verdictWord[verdict]}
      </span>
    </span>
  );
}

interface VerdictHeadingProps {
  verdict: VerdictName;
  /** 'Within at 45 and 110 N·m (short check)' where the whole is not simply within. */
  words?: ReactNode;
  level?: 1 | 2;
  className?: string;
}

/** The verdict of a whole check as the heading of its page. */
export function VerdictHeading({ verdict, words, level = 1, className }: VerdictHeadingProps) {
  const Heading = level === 1 ? 'h1' : 'h2';
  return (
    <div className={clsx('flex items-center gap-4', className)}>
      <VerdictShape verdict={verdict} className="size-16 shrink-0" />
      <Heading
        className={clsx(
          'font-code min-w-0 leading-[1.02] font-bold',
          words === undefined ? 'text-5xl' : 'text-4xl',
        )}
      >
        {words ?? verdictHeadline[verdict]}
      </Heading>
    </div>
  );
}
