import type { Inheritance } from '#shared/rules/facts.ts';
import { allergensLine, culturesLine } from '../../../app/carriedWords.ts';
import { SheetPart } from './SheetPart.tsx';

/** What is in this beer by what went before it: never left out. */
export function SheetCarries({ carried }: { carried: Inheritance }) {
  return (
    <SheetPart title="In this beer by its own plan or by the cake">
      <p>
        <b>Allergens:</b> {allergensLine(carried)}
      </p>
      <p>
        <b>Live cultures and enzymes beside the yeast:</b> {culturesLine(carried)}
      </p>
    </SheetPart>
  );
}
