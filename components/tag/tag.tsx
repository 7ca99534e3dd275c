import clsx from 'clsx';
import type { CSSProperties, ReactNode } from 'react';

export type TagSize = 'board' | 'card' | 'small';

interface TagProps {
  /** The tag's code, such as `A27`. */
  code: string;
  /** One quiet line below the code. */
  line?: ReactNode;
  size?: TagSize;
  /** Hangs on a peg of the wall; otherwise it lies flat. */
  hangs?: boolean;
  /** Height of the code's capitals as a CSS length, where the size's own is not enough. */
  capHeight?: string;
  className?: string;
}

/** Sets the height of the capitals; a custom property is not part of React's own style type. */
function capStyle(capHeight: string | undefined): CSSProperties | undefined {
  return capHeight === undefined ? undefined : ({ '--tag-cap': capHeight } as CSSProperties);
}

/** The manila tag: one tool at one meet. The same shape on paper, phone, bench and board. */
export function Tag({ code, line, size = 'card', hangs = false, capHeight, className }: TagProps) {
  return (
    <div
      className={clsx('tag', `tag-${size}`, hangs && 'tag-hangs', className)}
      style={capStyle(capHeight)}
    >
      <div className="tag-paper ground-manila">
        <span className="tag-ring" aria-hidden="true" />
        <span className="tag-code font-code font-bold">{code}</span>
        {line !== undefined && <span className="tag-line text-fore-quiet">{line}</span>}
      </div>
      {hangs && <span className="tag-peg" aria-hidden="true" />}
    </div>
  );
}

/** The code alone in the tag's type, for a page that is itself the tag. */
export function TagCode({ code, className }: { code: string; className?: string }) {
  return <span className={clsx('tag-code font-code block font-bold', className)}>{code}</span>;
}

/** A whole phone page as one tag; put it on `Pegboard`, on `ground-signal` or on chalk. */
export function TagPage({
  children,
  hangs = false,
  className,
}: {
  children: ReactNode;
  hangs?: boolean;
  className?: string;
}) {
  return (
    <div className={clsx('tag tag-page', hangs && 'tag-hangs', className)}>
      <div className="tag-paper ground-manila">
        <span className="tag-ring" aria-hidden="true" />
        {children}
      </div>
      {hangs && <span className="tag-peg" aria-hidden="true" />}
    </div>
  );
}
