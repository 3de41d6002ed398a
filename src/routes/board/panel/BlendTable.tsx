import type { ReactNode } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { format, formatBare, unitOf } from '#shared/units/quantity.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { fgOf, ogOf } from '../view/words.ts';

interface BlendTableProps {
  earlier: Batch;
  later: Batch;
  answer: LinkAnswer;
}

type Cell = number | null;
const UNKNOWN = '–';

/** The beer on the cake, the new wort, and what the two make together. */
export function BlendTable({ earlier, later, answer }: BlendTableProps) {
  const { units } = useBoardView();
  const bare = (kind: 'gravity' | 'bitterness') => (value: Cell) =>
    value === null ? UNKNOWN : formatBare(kind, value, units);
  const colour = (value: Cell) => <Colour srm={value} />;
  const warmth = (value: Cell) => (value === null ? UNKNOWN : format('temperature', value, units));
  const { blend } = answer;
  const gravity = units.gravity === 'sg' ? 'Gravity' : `Gravity, ${unitOf('gravity', units)}`;
  return (
    <table className="mt-3 mb-1 w-full border-collapse text-[0.90625rem]">
      <thead>
        <tr className="text-small text-ink2 *:border-b *:border-line2 *:py-[5px] *:pl-2 *:text-right *:font-semibold *:whitespace-nowrap">
          <td />
          <th scope="col">
            <span className="sr-only">beer </span>on the cake
          </th>
          <th scope="col">new wort</th>
          <th scope="col">as poured</th>
        </tr>
      </thead>
      <tbody>
        <Row
          name={gravity}
          show={bare('gravity')}
          values={[fgOf(earlier), ogOf(later), blend.og]}
        />
        <Row
          name={`Colour, ${unitOf('colour', units)}`}
          show={colour}
          values={[earlier.srm, later.srm, blend.srm]}
        />
        <Row
          name="Bitterness, IBU"
          show={bare('bitterness')}
          values={[earlier.ibu, later.ibu, blend.ibu]}
        />
        <Row name="Ferments at" show={warmth} values={[earlier.fermentC, later.fermentC]} />
      </tbody>
    </table>
  );
}

interface RowProps {
  name: string;
  show: (value: Cell) => ReactNode;
  values: readonly Cell[];
}

function Row({ name, show, values }: RowProps) {
  const [onCake = null, wort = null, poured] = values;
  return (
    <tr className="*:border-b *:border-line2 *:py-[5px] *:pl-2 *:text-right *:whitespace-nowrap last:*:border-b-0">
      <th scope="row" className="pl-0! text-left! font-normal text-ink2">
        {name}
      </th>
      <td>{show(onCake)}</td>
      <td>{show(wort)}</td>
      <td className="font-bold">{poured === undefined ? '' : show(poured)}</td>
    </tr>
  );
}

function Colour({ srm }: { srm: Cell }) {
  const { units } = useBoardView();
  if (srm === null) return UNKNOWN;
  return (
    <span className="inline-flex items-center gap-1.5">
      <Swatch srm={srm} />
      {formatBare('colour', srm, units)}
    </span>
  );
}
