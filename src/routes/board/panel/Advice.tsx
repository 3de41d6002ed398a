import type { Advice as AdviceText } from '#shared/rules/answer.ts';
import { PanelPart } from './PanelFrame.tsx';

/** Advice is no verdict: it stands after them. */
export function Advice({ advice }: { advice: readonly AdviceText[] }) {
  if (advice.length === 0) return null;
  return (
    <PanelPart title="On the brew day">
      <ul className="mt-1 list-disc space-y-1 pl-5 text-ink2 marker:text-edge">
        {advice.map((item) => (
          <li key={item.id}>{item.text}</li>
        ))}
      </ul>
    </PanelPart>
  );
}
