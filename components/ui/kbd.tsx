import type { ReactNode } from 'react';

/** A key of the keyboard. */
export function Kbd({ children }: { children: ReactNode }) {
  return (
    <kbd className="font-reading border-control text-ink inline-block min-w-8 rounded-md border border-b-3 bg-white px-2 text-center text-[0.9em] leading-relaxed">
      {children}
    </kbd>
  );
}

/** A key with what it does; the whole of it is one hint in the bench's bottom line. */
export function KeyHint({ keys, children }: { keys: string; children: ReactNode }) {
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
      <Kbd>{keys}</Kbd> {children}
    </span>
  );
}
