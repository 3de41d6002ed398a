import type { Verdict } from '#shared/rules/vocabulary.ts';

/** The verdict's shape: a circle with a tick, a triangle with a stroke, an octagon with a cross. */
export function VerdictMark({ verdict, size = 16 }: { verdict: Verdict; size?: number }) {
  const sign = {
    fill: 'none',
    stroke: 'var(--in-badge)',
    strokeWidth: 1.9,
    strokeLinecap: 'round',
  } as const;
  return (
    <svg aria-hidden width={size} height={size} viewBox="0 0 16 16" className="block shrink-0">
      {verdict === 'pour' && (
        <>
          <circle cx="8" cy="8" r="7.2" fill="currentColor" />
          <path d="M4.5 8.3l2.3 2.3 4.6-5" {...sign} strokeLinejoin="round" />
        </>
      )}
      {verdict === 'mind' && (
        <>
          <path
            d="M8 1 15.6 14.8H.4z"
            fill="currentColor"
            stroke="currentColor"
            strokeLinejoin="round"
          />
          <path d="M8 5.8v4.1M8 12.3v.1" {...sign} />
        </>
      )}
      {verdict === 'hold' && (
        <>
          <path d="M5 .8h6L15.2 5v6L11 15.2H5L.8 11V5z" fill="currentColor" />
          <path d="M5.4 5.4l5.2 5.2m0-5.2l-5.2 5.2" {...sign} />
        </>
      )}
    </svg>
  );
}
