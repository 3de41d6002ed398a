import { useBoardView } from '../../board/view/BoardView.tsx';
import { beerFacts } from '../../board/view/words.ts';

/** What is on no cake yet, in two columns. */
export function PrintedBench() {
  const { index, units } = useBoardView();
  if (index.bench.length === 0) return null;
  return (
    <section className="mt-6">
      <h2 className="break-after-avoid text-[1.4em]">On the bench</h2>
      <ul className="mt-1 columns-2 gap-8 max-tablet:columns-1">
        {index.bench.map((batch) => {
          const { gravity, rest } = beerFacts(batch, units);
          return (
            <li key={batch.id} className="break-inside-avoid border-b border-line2 py-1">
              <b>{batch.name}</b>
              {batch.style && `, ${batch.style}`}
              <span className="block">{[gravity, ...rest].join(' · ')}</span>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
