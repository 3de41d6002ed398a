import { useBoardView } from '../view/BoardView.tsx';

/** Vessels and days on which plans collide. */
export function ConflictList() {
  const { judged } = useBoardView();
  if (judged.conflicts.length === 0) return null;
  return (
    <div className="mt-4 border-t border-line pt-3">
      <h3 className="text-[1.03125rem] font-[680]">Vessels and days</h3>
      <ul className="mt-1 list-disc space-y-1 pl-5 text-ink2 marker:text-edge">
        {judged.conflicts.map((conflict) => (
          <li key={conflict.text}>{conflict.text}</li>
        ))}
      </ul>
    </div>
  );
}
