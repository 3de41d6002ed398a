/** Two vessels on a shelf. */
export const ShelfIcon = () => (
  <svg
    width="22"
    height="22"
    viewBox="0 0 22 22"
    aria-hidden="true"
    fill="none"
    stroke="currentColor"
    strokeWidth="2"
    strokeLinecap="round"
    strokeLinejoin="round"
  >
    <path d="M2 18h18M5 18V7h4.500v11M12.500 18V7H17v11" />
  </svg>
);
