import clsx from 'clsx';
import { useId, type ReactNode } from 'react';

interface PanelProps {
  title?: ReactNode;
  /** Buttons or a quiet fact at the right of the title. */
  aside?: ReactNode;
  /** Level of the heading in the page's outline. */
  level?: 2 | 3;
  /** Rule above, as between parts of a page; otherwise a bordered box. */
  plain?: boolean;
  id?: string;
  className?: string;
  children?: ReactNode;
}

/** A titled part of a page. */
export function Panel({ title, aside, level = 2, plain, id, className, children }: PanelProps) {
  const headingId = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <section
      id={id}
      aria-labelledby={title === undefined ? undefined : headingId}
      className={clsx(
        plain ? 'border-line border-t pt-5' : 'border-line rounded-lg border p-5',
        className,
      )}
    >
      {(title !== undefined || aside !== undefined) && (
        <header className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
          {title !== undefined && (
            <Heading
              id={headingId}
              className={clsx('font-code font-semibold', level === 2 ? 'text-2xl' : 'text-xl')}
            >
              {title}
            </Heading>
          )}
          {aside}
        </header>
      )}
      {children}
    </section>
  );
}

/** A part of a page under a rule, without a box. */
export function Section(props: Omit<PanelProps, 'plain'>) {
  return <Panel {...props} plain />;
}
