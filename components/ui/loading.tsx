import clsx from 'clsx';

/** The place of something to come; its size by class. Still when less motion is asked for. */
export function Skeleton({ className }: { className?: string }) {
  return (
    <span
      aria-hidden="true"
      className={clsx('bg-line block rounded-md motion-safe:animate-pulse', className)}
    />
  );
}

/** Says that something is being fetched, with a few lines in its place. */
export function Loading({ label = 'Loading', lines = 3 }: { label?: string; lines?: number }) {
  return (
    <div role="status" className="flex flex-col gap-3">
      <span className="text-fore-quiet">{label}…</span>
      {Array.from({ length: lines }, (_, index) => (
        <Skeleton key={index} className={clsx('h-5', index === lines - 1 && 'w-2/3')} />
      ))}
    </div>
  );
}
