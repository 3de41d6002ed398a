/** A place that stays shut. */
export function Lock({ size = 16 }: { size?: number }) {
  return (
    <svg aria-hidden width={size} height={size} viewBox="0 0 16 16" className="block shrink-0">
      <rect x="2.5" y="7" width="11" height="7.5" rx="1.5" fill="currentColor" />
      <path d="M5 7V5a3 3 0 016 0v2" fill="none" stroke="currentColor" strokeWidth="1.8" />
    </svg>
  );
}
