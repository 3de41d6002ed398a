interface LogoProps {
  size?: number;
  /** Off the top bar the cake needs its edge. */
  onPaper?: boolean;
}

/** The mark: a vessel with its cake. The name stands beside it in text. */
export function Logo({ size = 28, onPaper = false }: LogoProps) {
  return (
    <svg
      aria-hidden
      width={(size * 22) / 28}
      height={size}
      viewBox="0 0 22 28"
      className="block shrink-0"
    >
      <path
        d="M3 2h16M5 2v5c0 2-3 3-3 7v9a3 3 0 003 3h12a3 3 0 003-3v-9c0-4-3-5-3-7V2"
        fill="none"
        stroke="currentColor"
        strokeWidth="2.2"
        strokeLinecap="round"
      />
      <path
        d="M2.6 18.6q4.7-2.2 8.4 0t8.4 0v4.4a2.4 2.4 0 01-2.4 2.4H5a2.4 2.4 0 01-2.4-2.4z"
        className={onPaper ? 'fill-cake stroke-cake-dd' : 'fill-cake'}
        strokeWidth="1.2"
      />
    </svg>
  );
}
