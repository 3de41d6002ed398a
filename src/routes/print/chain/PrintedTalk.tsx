import { formatDay } from '#shared/units/day.ts';
import { useTalk } from '../../../api/comments.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';

/** What was said of the chain; only where somebody wants it on the paper. */
export function PrintedTalk({ chainId }: { chainId: string }) {
  const { board, slug } = useBoardView();
  const { data, error } = useTalk(slug, chainId, board.season.revision);
  const said = data?.comments.filter(({ text }) => text !== null) ?? [];
  return (
    <section className="mt-5">
      <h2 className="break-after-avoid text-[1.3em]">Talk</h2>
      {error && !data && <p>{sentenceOf(error)}</p>}
      {data && said.length === 0 && <p>Nobody said anything yet.</p>}
      <ol aria-label="Talk">
        {said.map(({ id, by, at, text }) => (
          <li key={id} className="mt-1 break-inside-avoid">
            <b>{by.name}</b>, {formatDay(at.slice(0, 10))}: {text}
          </li>
        ))}
      </ol>
    </section>
  );
}
