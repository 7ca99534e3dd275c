'use client';

import { useEffect, useId, useRef, type ReactNode } from 'react';
import { Button } from '../ui/button';

interface BenchPanelProps {
  title: ReactNode;
  onClose: () => void;
  children: ReactNode;
}

/** Something to settle beside the work. It takes the focus, and never covers the instruction. */
export function BenchPanel({ title, onClose, children }: BenchPanelProps) {
  const headingId = useId();
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    // A field inside that asked for the focus keeps it.
    const panel = heading.current?.closest('section');
    if (!panel?.contains(document.activeElement)) heading.current?.focus();
  }, []);
  return (
    <section
      aria-labelledby={headingId}
      className="border-fore bg-ground flex flex-col gap-3 rounded-lg border-2 px-5 py-4"
    >
      <header className="flex items-start justify-between gap-4">
        <h2
          id={headingId}
          ref={heading}
          tabIndex={-1}
          className="font-code text-3xl leading-tight font-semibold outline-none"
        >
          {title}
        </h2>
        <Button variant="quiet" onClick={onClose}>
          Close
        </Button>
      </header>
      {children}
    </section>
  );
}
