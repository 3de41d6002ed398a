/** Holds the place of what is on its way. */
export function Skeleton({ rows = 3, label = 'Loading' }: { rows?: number; label?: string }) {
  return (
    <div role="status" className="space-y-4 py-2">
      <span className="sr-only">{label}</span>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className="h-20 rounded-card bg-line2 motion-safe:animate-pulse" />
      ))}
    </div>
  );
}
