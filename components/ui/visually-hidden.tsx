import type { ElementType, ReactNode } from 'react';

/** For screen readers only. */
export function VisuallyHidden({
  as: Element = 'span',
  children,
}: {
  as?: ElementType;
  children: ReactNode;
}) {
  return <Element className="sr-only">{children}</Element>;
}
