import { formatMoney } from '#shared/units/money.ts';
import { EXAMPLE_PACK_PRICE, EXAMPLE_YEAST } from '../public/exampleChain.ts';

/** The three that are poured share the pack; the fourth waits. */
const POURED = 3;

export function ExampleHead() {
  const { minor, currency } = EXAMPLE_PACK_PRICE;
  return (
    <div className="flex flex-wrap items-baseline gap-x-3.5 gap-y-1 px-14 max-wide:px-10 max-tablet:px-5">
      <h2 id="example" className="text-[1.1875rem] leading-tight font-[680]">
        One pack of {EXAMPLE_YEAST.name}, three beers, and a fourth that should wait
      </h2>
      <p className="text-body text-ink2">
        {formatMoney(Math.round(minor / POURED), currency)} of yeast a batch instead of{' '}
        {formatMoney(minor, currency)}
      </p>
    </div>
  );
}
