import { Logo } from '../drawn/Logo.tsx';

/** The mark with the name beside it, in the colour of its ground. */
export function Wordmark({ onPaper = false }: { onPaper?: boolean }) {
  return (
    <span className="flex items-center gap-2.5 font-display text-[1.5rem] font-bold tracking-[-.03em]">
      <Logo size={onPaper ? 32 : 28} onPaper={onPaper} />
      Barmkin
    </span>
  );
}
