import type { ReactNode } from 'react';

export type Fact = [label: string, value: ReactNode];

/** Pairs of a name and what it is; what is null or empty is left out. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  return (
    <dl className="flex flex-col">
      {facts
        .filter(([, value]) => value !== null && value !== '')
        .map(([label, value]) => (
          <div
            key={label}
            className="border-line grid grid-cols-[minmax(0,2fr)_minmax(0,3fr)] gap-x-4 border-t py-1.5"
          >
            <dt className="text-fore-quiet">{label}</dt>
            <dd>{value}</dd>
          </div>
        ))}
    </dl>
  );
}
