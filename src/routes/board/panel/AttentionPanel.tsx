import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { useBoardView, type BoardViewValue } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { count, countedFindings, shortReason } from '../view/words.ts';
import { ConflictList } from './ConflictList.tsx';

interface OpenLink {
  later: Batch;
  earlier: Batch;
  link: JudgedLink;
}

/** Links that ask for a look, the holds first, each group in the order of the shelves. */
export function linksToLookAt({ index, judged }: Pick<BoardViewValue, 'index' | 'judged'>) {
  const links = index.chains.flatMap((chain) =>
    index.batchesOf(chain.id).flatMap((later): OpenLink[] => {
      const link = judged.links.get(later.id);
      const earlier = index.predecessor(later.id);
      return link && earlier && link.verdict !== 'pour' ? [{ later, earlier, link }] : [];
    }),
  );
  const rank = ({ link }: OpenLink) => (link.verdict === 'hold' ? (link.accepted ? 2 : 0) : 1);
  return links.toSorted((a, b) => rank(a) - rank(b));
}

/** What stands beside the shelves while nothing is opened. */
export function AttentionPanel() {
  const view = useBoardView();
  const links = linksToLookAt(view);
  const { pour, unchecked } = view.judged.totals;
  return (
    <section aria-labelledby="attention" className="px-6 pt-5 pb-10">
      <h2 id="attention" className="text-h2">
        {links.length === 0 ? 'Nothing on hold' : 'What to look at'}
      </h2>
      <p className="mt-0.5 text-ink2">{sumWords(pour, unchecked)}</p>
      <LinkRows links={links} />
      <ConflictList />
      <p className="mt-4 border-t border-line pt-3 text-small text-ink2">
        Choose a verdict to see why, in numbers, and what to do about it.
      </p>
    </section>
  );
}

function sumWords(pour: number, unchecked: number): string {
  const links = pour === 0 ? 'No link' : count(pour, 'link');
  const words = `${links} may be poured as planned`;
  return unchecked === 0 ? words : `${words}; ${count(unchecked, 'link')} not fully checked`;
}

const FIRST = 12;

/** The first dozen; a season in disorder has hundreds, and nobody reads those at once. */
function LinkRows({ links }: { links: readonly OpenLink[] }) {
  const [isAll, setIsAll] = useState(false);
  const shown = isAll ? links : links.slice(0, FIRST);
  return (
    <>
      <ul className="mt-3">
        {shown.map((item) => (
          <LinkRow key={item.later.id} {...item} />
        ))}
      </ul>
      {shown.length < links.length && (
        <Button size="small" look="quiet" onClick={() => setIsAll(true)}>
          Show all {links.length}
        </Button>
      )}
    </>
  );
}

function LinkRow({ later, earlier, link }: OpenLink) {
  const { open } = useBoardPanel();
  return (
    <li className="border-t border-line">
      <button
        type="button"
        onClick={() => open({ kind: 'link', laterId: later.id })}
        className="block w-full rounded-lg py-2.5 text-left hover:bg-line2"
      >
        <VerdictPill verdict={link.verdict} findings={countedFindings(link)} />
        <b className="mt-1 block leading-tight wrap-anywhere">
          {later.name} onto {earlier.name}
        </b>
        <span className="text-small text-ink2">
          {shortReason(link, '')}
          {link.accepted && ', accepted'}
        </span>
      </button>
    </li>
  );
}
