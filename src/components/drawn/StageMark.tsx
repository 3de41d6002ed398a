import type { Stage } from '#shared/api/batch.ts';

/** A ring, dashed for a pencilled batch, half full under beer, full when racked, crossed out. */
export function StageMark({ stage }: { stage: Stage }) {
  return (
    <svg
      aria-hidden
      width="14"
      height="14"
      viewBox="0 0 14 14"
      className="block shrink-0 text-ink2"
    >
      <circle
        cx="7"
        cy="7"
        r="5.6"
        fill={stage === 'racked' ? 'currentColor' : 'none'}
        stroke="currentColor"
        strokeWidth="2"
        strokeDasharray={stage === 'pencilled' ? '3.5 2.36' : undefined}
      />
      {stage === 'fermenting' && <path d="M1.4 7a5.6 5.6 0 0 0 11.2 0z" fill="currentColor" />}
      {stage === 'scrapped' && (
        <path d="M3.2 10.8l7.6-7.6" stroke="currentColor" strokeWidth="2" strokeLinecap="round" />
      )}
    </svg>
  );
}
