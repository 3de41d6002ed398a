import type { Advice as AdviceText } from '#shared/rules/answer.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { PanelPart } from './PanelFrame.tsx';

/** Advice is no verdict: it stands after them. The surplus is told beside the kept part. */
export function Advice({ advice }: { advice: readonly AdviceText[] }) {
  const told = advice.filter(({ id }) => id !== 'jar-the-rest');
  if (told.length === 0) return null;
  return (
    <PanelPart title="On the brew day">
      <ul className="mt-1 list-disc space-y-1 pl-5 text-ink2 marker:text-edge">
        {told.map((item) => (
          <li key={item.id}>{unbroken(item.text)}</li>
        ))}
      </ul>
    </PanelPart>
  );
}
