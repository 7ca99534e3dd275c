import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';
import { WarningShape } from './warning-shape';

export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger';
/** `big` is for gloves: at least 64 px high. */
export type ButtonSize = 'normal' | 'big';

export interface ButtonLook {
  variant?: ButtonVariant;
  size?: ButtonSize;
  /** Takes the width of its column. */
  wide?: boolean;
}

const variantClass: Record<ButtonVariant, string> = {
  primary: 'border-2 border-fore bg-fore text-ground',
  secondary: 'border-2 border-fore bg-transparent text-fore',
  quiet: 'border-2 border-transparent text-fore underline underline-offset-4',
  // No colour says danger here: a double edge and a warning triangle do.
  danger: 'border-6 border-double border-fore bg-transparent text-fore',
};

const sizeClass: Record<ButtonSize, string> = {
  normal: 'min-h-12 px-5 py-2',
  big: 'min-h-16 px-7 py-3 text-xl',
};

/** Class names of a button, for an element that must look like one. */
export function buttonClass({ variant = 'primary', size = 'normal', wide }: ButtonLook): string {
  return clsx(
    'inline-flex items-center justify-center gap-2.5 rounded-lg text-center leading-tight',
    'font-semibold transition-[translate,opacity] duration-100 active:translate-y-px',
    'aria-disabled:cursor-default aria-disabled:opacity-60 disabled:opacity-60',
    variantClass[variant],
    sizeClass[size],
    wide && 'w-full',
  );
}

interface ButtonProps extends ButtonLook, ComponentProps<'button'> {
  /** Its action is under way: it keeps the focus and does nothing when pressed again. */
  pending?: boolean;
  /** What it says meanwhile; its own words when left out. */
  pendingLabel?: ReactNode;
}

/** A button. `type` is 'button' unless said otherwise, so that none submits by accident. */
export function Button({
  variant = 'primary',
  size = 'normal',
  wide,
  pending = false,
  pendingLabel,
  type = 'button',
  className,
  onClick,
  children,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={pending ? 'button' : type}
      onClick={pending ? undefined : onClick}
      aria-disabled={pending || rest['aria-disabled'] || undefined}
      aria-busy={pending || undefined}
      className={clsx(buttonClass({ variant, size, wide }), className)}
    >
      {variant === 'danger' && <WarningShape className="size-5 shrink-0" />}
      {pending && pendingLabel !== undefined ? pendingLabel : children}
    </button>
  );
}
