import { useBoard } from '../../../api/board.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { format } from '#shared/units/quantity.ts';

/** What a place is judged by: yeast, temperature, volume. */
export function PlacesLead({ batchId }: { batchId: string }) {
  const board = useBoard();
  const units = useUnits();
  const batch = board.batches.find((row) => row.id === batchId);
  if (!batch) return null;
  const yeast = board.yeasts.find((row) => row.id === batch.yeastId)?.name ?? 'any yeast';
  const facts = [
    yeast,
    batch.fermentC === null ? null : `ferments at ${format('temperature', batch.fermentC, units)}`,
    batch.volumeL === null ? null : format('volume', batch.volumeL, units),
  ];
  return <span className="mt-1 block text-ink2">{facts.filter(Boolean).join(' · ')}</span>;
}
