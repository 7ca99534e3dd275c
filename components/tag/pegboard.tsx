import clsx from 'clsx';
import type { ElementType, ReactNode } from 'react';

interface PegboardProps {
  children?: ReactNode;
  as?: ElementType;
  className?: string;
}

/** The workshop wall that tags hang on; sets light text for everything on it. */
export function Pegboard({ children, as: Element = 'div', className }: PegboardProps) {
  return <Element className={clsx('ground-wall pegboard', className)}>{children}</Element>;
}
