import clsx from 'clsx';
import type { LiveState } from '../../live/connection.ts';
import { useLive } from '../../live/useLiveSeason.ts';

const WORDS: Record<LiveState, string> = {
  connecting: '',
  live: 'Live',
  reconnecting: 'Reconnecting',
  ended: '',
};

/** Whether the page hears of others' changes as they happen. Only the loss is read out. */
export function LiveMark() {
  const { state } = useLive();
  const isLost = state === 'reconnecting';
  return (
    <>
      {WORDS[state] !== '' && (
        <span
          className={clsx('flex items-center gap-1.5', !isLost && 'max-tablet:hidden')}
          title={
            isLost
              ? 'Changes of others do not arrive at the moment'
              : 'Changes of others arrive as they happen'
          }
        >
          <span
            className={clsx(
              'size-2 rounded-full border-[1.5px] border-on-bar',
              !isLost && 'bg-on-bar',
            )}
          />
          {WORDS[state]}
        </span>
      )}
      <span aria-live="polite" className="sr-only">
        {isLost && 'Changes of others do not arrive at the moment. Trying to reach the server.'}
      </span>
    </>
  );
}
