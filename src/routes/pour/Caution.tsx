import { TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';

/** The usual caution of the hour, in one sentence. */
export const Caution = ({ children }: { children: ReactNode }) => (
  <p className="mt-3 flex max-w-xl gap-2 text-body text-ink2">
    <TriangleAlert size={18} aria-hidden className="mt-0.5 shrink-0 text-mind" />
    <span>{children}</span>
  </p>
);
