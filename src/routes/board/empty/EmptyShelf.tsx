import clsx from 'clsx';
import type { VesselShape } from '#shared/api/vessel.ts';
import { Silhouette } from '../../../components/drawn/Silhouette.tsx';

const LATER: readonly { shape: VesselShape; words: string; when: string }[] = [
  { shape: 'bucket', words: 'The second beer is poured onto its cake', when: '+2 weeks' },
  { shape: 'conical', words: 'and the third, a bit stronger and darker', when: '+4 weeks' },
  { shape: 'carboy', words: 'until the yeast is tired', when: '+6 weeks' },
];

/** What a chain will look like, in dashes: nothing of it exists yet. */
export function EmptyShelf() {
  return (
    <div className="mt-3 max-tablet:hidden">
      <div className="relative flex h-[238px] items-end gap-6 overflow-hidden pr-7 pl-14 max-wide:pl-7">
        <i
          aria-hidden
          className="absolute right-[20%] bottom-[13px] left-[130px] h-3 border-t-2 border-dashed border-edge bg-[repeating-linear-gradient(90deg,var(--cake)_0_10px,transparent_10px_18px)] opacity-70"
        />
        <i aria-hidden className="shelf-line absolute inset-x-0 bottom-0 h-[13px]" />
        <div className="relative flex w-[330px] shrink-0 items-end gap-4 pb-[10px]">
          <Silhouette
            shape="bucket"
            width={132}
            strokeWidth={2.4}
            className="fill-white stroke-bottle"
          >
            <path
              d="M42 62v32M26 78h32"
              className="stroke-bottle"
              strokeWidth="4"
              strokeLinecap="round"
            />
          </Silhouette>
          <div className="pb-8">
            <h2 className="text-h2">Your first cake</h2>
            <p className="mt-1 max-w-[176px] leading-[1.35] text-ink2">
              A fresh pack, slurry from outside, or a cake under beer now.
            </p>
          </div>
        </div>
        {LATER.map(({ shape, words }, place) => (
          <Ghost key={shape} shape={shape} words={words} place={place} />
        ))}
      </div>
      <ol className="flex gap-6 pt-2 pr-7 pl-14 text-small text-ink2 max-wide:pl-7">
        {['today', ...LATER.map(({ when }) => when)].map((when, place) => (
          <li key={when} className={whereOf(place - 1, place === 0 ? 'w-[330px]' : 'w-[262px]')}>
            <span className="ml-6 inline-block rounded-t-tag rounded-b-tag-foot border-[1.5px] border-dashed border-edge px-3 py-0.5">
              {when}
            </span>
          </li>
        ))}
      </ol>
    </div>
  );
}

/** The later vessels give way where the page is narrow. */
const whereOf = (place: number, width: string) =>
  clsx(width, 'shrink-0', place === 1 && 'max-wide:hidden', place === 2 && 'max-[86rem]:hidden');

interface GhostProps {
  shape: VesselShape;
  words: string;
  place: number;
}

function Ghost({ shape, words, place }: GhostProps) {
  return (
    <div className={clsx('relative flex items-end gap-3 pb-[11px]', whereOf(place, 'w-[262px]'))}>
      <Silhouette shape={shape} width={104} strokeWidth={1.8} />
      <p className="w-[130px] pb-10 leading-[1.3] text-ink2">{words}</p>
    </div>
  );
}
