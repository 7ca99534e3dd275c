import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';

interface DataTableProps extends ComponentProps<'table'> {
  /** Names the table, and its scrolling region on narrow screens. */
  caption: string;
  /** Shows the caption above the table; otherwise only screen readers have it. */
  showCaption?: boolean;
  children: ReactNode;
}

/** A plain table; scrolls sideways by touch and by keyboard where it is wider than the screen. */
export function DataTable({ caption, showCaption, className, children, ...rest }: DataTableProps) {
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
      <table {...rest} className={clsx('w-full border-collapse text-left', className)}>
        <caption
          className={showCaption ? 'font-code pb-2 text-left text-xl font-semibold' : 'sr-only'}
        >
          {caption}
        </caption>
        {children}
      </table>
    </div>
  );
}

/** A row; `current` marks the one that is being worked on with a bar, not a colour. */
export function Row({ current, className, ...rest }: { current?: boolean } & ComponentProps<'tr'>) {
  return (
    <tr
      {...rest}
      aria-current={current || undefined}
      className={clsx(
        'border-line border-b align-top',
        current && 'shadow-[inset_6px_0_0_var(--fore)] *:first:pl-4',
        className,
      )}
    />
  );
}

/** A column's or (scope row) a row's heading. */
export function HeadCell({
  numeric,
  scope = 'col',
  className,
  ...rest
}: { numeric?: boolean } & ComponentProps<'th'>) {
  return (
    <th
      {...rest}
      scope={scope}
      className={clsx(
        'px-3 py-2 font-semibold first:pl-0 last:pr-0',
        scope === 'col' && 'border-fore border-b-2 align-bottom leading-tight',
        numeric && 'text-right',
        className,
      )}
    />
  );
}

/** A cell; `numeric` sets it in tabular figures, to the right. */
export function Cell({
  numeric,
  className,
  ...rest
}: { numeric?: boolean } & ComponentProps<'td'>) {
  return (
    <td
      {...rest}
      className={clsx(
        'px-3 py-2 first:pl-0 last:pr-0',
        numeric && 'font-reading text-right whitespace-nowrap',
        className,
      )}
    />
  );
}
