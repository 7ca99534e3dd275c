/** An upright triangle with a mark: heed this. Not one of the verdicts' shapes. */
export function WarningShape({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 24 24" className={className} aria-hidden="true" focusable="false">
      <path d="M12 2.5 23 21.5H1z" fill="none" stroke="currentColor" strokeWidth="2.2" />
      <path d="M12 9v6.2m0 2v2.2" stroke="currentColor" strokeWidth="2.4" />
    </svg>
  );
}
