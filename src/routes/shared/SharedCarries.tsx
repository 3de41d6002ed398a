import type { SharedChain } from '#shared/api/share.ts';
import { allergensLine, culturesLine } from '../../app/carriedWords.ts';
import { PanelPart } from '../board/panel/PanelFrame.tsx';

/** The usual cautions of a pour, each in one sentence. */
const CAUTIONS = [
  'An allergen of any earlier beer of the chain is in this one, whatever the dilution; labelling law is local.',
  'A hopped, infected, diastatic or enzyme-treated cake can make the packaged beer over-carbonate and burst.',
  'Hot wort burns; fermentation gives off carbon dioxide: keep the room aired and never seal what may still ferment.',
  "The maker's instructions and local codes go first. Where a licence is needed to brew or sell, the licensed brewer decides.",
];

/** What may be in every beer of the chain, in plain words, whatever else the link leaves out. */
export function SharedCarries({ shared }: { shared: SharedChain }) {
  return (
    <aside aria-label="What the chain carries" className="max-wide:mt-4 wide:pt-2">
      <PanelPart title="Allergens in the chain">
        <p className="mt-1 text-touch">{allergensLine(shared.carries)}</p>
      </PanelPart>
      <PanelPart title="Live cultures and enzymes beside the yeast">
        <p className="mt-1 text-touch">{culturesLine(shared.carries)}</p>
      </PanelPart>
      <PanelPart title="Cautions">
        <ul className="mt-1 list-disc space-y-1.5 pl-5 text-ink2 marker:text-edge">
          {CAUTIONS.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </PanelPart>
      <p className="border-t border-line pt-3 text-small text-ink2">
        Checked by the house rules of {shared.breweryName}, from this chain alone: what stands on
        their other shelves is not shown and not counted.
      </p>
    </aside>
  );
}
