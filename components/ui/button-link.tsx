import clsx from 'clsx';
import Link from 'next/link';
import type { ComponentProps } from 'react';
import { buttonClass, type ButtonLook } from './button';

/**
 * A link that looks like a button; goes through Next's router. In a file of its own, so that a page
 * with buttons alone does not load the router's link.
 */
export function ButtonLink({
  variant = 'primary',
  size = 'normal',
  wide,
  className,
  ...rest
}: ButtonLook & ComponentProps<typeof Link>) {
  return <Link {...rest} className={clsx(buttonClass({ variant, size, wide }), className)} />;
}
