import { useBoard, useJudged } from '../../../api/board.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { countedFindings } from '../view/words.ts';
import type { Change } from './liftState.ts';
import { batchName } from './words.ts';
import { indexed } from './indexed.ts';

/** The links that a drop touched: of the moved batch, of the one behind it, of where it was. */
function useChangedLinks({ request, gap }: Change): JudgedLink[] {
  const board = useBoard();
  const { links } = useJudged();
  const { chainId } = board.batches.find((row) => row.id === request.batchId) ?? {};
  const row = chainId ? indexed(board).batchesOf(chainId) : [];
  const behind = row[row.findIndex((batch) => batch.id === request.batchId) + 1];
  const ids = [request.batchId, behind?.id, ...gap.changes.map(({ laterId }) => laterId)];
  return [...new Set(ids)].flatMap((id) => links.get(id ?? '') ?? []);
}

const ON_HOLD =
  'Planning a hold is allowed. Before it is poured, mend it, or the head brewer accepts it at the link with a reason; never an allergen, a wild culture or an overfull vessel.';

/** How those links stand now, each finding by its title and its reason. */
export function ChangedLinks({ change }: { change: Change }) {
  const board = useBoard();
  const links = useChangedLinks(change);
  if (links.length === 0) return null;
  const hasHold = links.some((link) => link.verdict === 'hold' && !link.accepted);
  return (
    <div>
      <h3 className="text-h3">The links now</h3>
      <ul className="mt-1 divide-y divide-line2">
        {links.map((link) => (
          <li key={link.to} className="py-2">
            <p className="flex flex-wrap items-center gap-2 font-semibold [overflow-wrap:anywhere]">
              <VerdictPill
                verdict={link.verdict}
                findings={countedFindings(link)}
                unchecked={link.unchecked.length}
              />
              {batchName(board, link.to)} onto {batchName(board, link.from)}
            </p>
            {link.findings.map((finding) => (
              <p key={finding.rule} className="mt-1 text-small text-ink2">
                <b className="text-ink">{finding.title}.</b> {finding.because}
              </p>
            ))}
          </li>
        ))}
      </ul>
      {hasHold && <p className="mt-2 text-small text-hold">{ON_HOLD}</p>}
    </div>
  );
}
