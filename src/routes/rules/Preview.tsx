import { useDeferredValue, useMemo } from 'react';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import { linkChanges, type LinkChange } from '#shared/chain/linkChanges.ts';
import { useBoard } from '../../api/board.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { SayingPill } from './SayingPill.tsx';

interface PreviewProps {
  changes: HouseRuleChanges;
  isSound: boolean;
}

/** What these rules would say of the links of the board, where that differs. */
export function Preview({ changes, isSound }: PreviewProps) {
  const links = useLinkChanges(changes, isSound);
  return (
    <Card>
      <CardTitle>On this board</CardTitle>
      <div aria-live="polite" className="mt-2">
        {links === null ? (
          <p className="text-ink2">Mend the fields that are marked to see what would change.</p>
        ) : links.length === 0 ? (
          <p className="text-ink2">Nothing on this board changes.</p>
        ) : (
          <>
            <p>
              {links.length === 1 ? '1 link' : `${links.length} links`} would be judged otherwise:
            </p>
            <ul className="mt-3 space-y-3">
              {links.map((link) => (
                <Changed key={link.batchId} link={link} />
              ))}
            </ul>
          </>
        )}
      </div>
    </Card>
  );
}

/** Null while a field has a fault: nothing can be judged by it. Worked out after the typing. */
function useLinkChanges(changes: HouseRuleChanges, isSound: boolean): LinkChange[] | null {
  const board = useBoard();
  const units = useUnits();
  const text = useDeferredValue(isSound ? JSON.stringify(changes) : null);
  return useMemo(
    () =>
      text === null
        ? null
        : linkChanges(board, { ...board, houseRules: JSON.parse(text) as HouseRuleChanges }, units),
    [board, text, units],
  );
}

function Changed({ link }: { link: LinkChange }) {
  const brewery = useBrewery();
  return (
    <li className="border-t border-line pt-3">
      <TextLink to={`${brewery.path()}?link=${link.batchId}`}>Cake under {link.name}</TextLink>
      <p className="mt-1.5 flex flex-wrap items-center gap-2">
        <SayingPill saying={link.from} />
        <span aria-hidden="true">→</span>
        <span className="sr-only">becomes</span>
        <SayingPill saying={link.to} />
      </p>
    </li>
  );
}
