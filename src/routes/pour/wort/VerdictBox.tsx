import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { TONES } from '../words.ts';
import { mixedWords, sayVerdict } from './verdictWords.ts';

/** Shape, word and colour; then when, or why not. */
export function VerdictBox() {
  const { standing, now } = usePourView();
  const { board, units } = useBoardView();
  const said = sayVerdict(standing, now, board.brewery.timeZone);
  const mixed = mixedWords(standing, units);
  return (
    <>
      <div
        role="status"
        className={`mt-4 flex items-center gap-3 rounded-xl border-2 px-4 py-3 ${TONES[said.verdict]}`}
        data-verdict={said.verdict}
      >
        <VerdictMark verdict={said.verdict} size={34} />
        <p className="min-w-0">
          <b className="text-lead">{said.title}</b>
          {said.next && <span className="block text-touch text-ink">{said.next}</span>}
        </p>
      </div>
      {mixed && <p className="mt-2 text-body text-ink2">{mixed}</p>}
      {standing.wort.findings.slice(1).map(({ rule, because }) => (
        <p key={rule} className="mt-2 text-body text-ink2">
          {because}
        </p>
      ))}
    </>
  );
}
