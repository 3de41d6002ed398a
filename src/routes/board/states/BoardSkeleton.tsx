import { SHELF, SHELF_HEIGHT } from '../view/drawing.ts';

/** Empty shelves in the places where the season's will stand. */
export function BoardSkeleton() {
  return (
    <main id="main" className="grow px-7 pt-6 max-tablet:px-[18px]" aria-busy="true">
      <p role="status" className="sr-only">
        Loading the board
      </p>
      <div aria-hidden className="motion-safe:animate-wait">
        <div className="h-8 w-56 rounded-lg bg-line2" />
        <div className="mt-2 mb-4 h-4 w-72 max-w-full rounded bg-line2" />
        {[0, 1, 2].map((shelf) => (
          <div key={shelf} className="relative max-tablet:hidden" style={{ height: SHELF_HEIGHT }}>
            <div className="absolute top-4 left-0 h-5 w-28 rounded bg-line2" />
            <div
              className="shelf-line absolute right-0 left-[148px]"
              style={{ top: SHELF.top, height: SHELF.board }}
            />
            {[0, 1, 2].map((vessel) => (
              <div
                key={vessel}
                className="absolute w-16 rounded-b-lg bg-line2"
                style={{ top: SHELF.top - 96, height: 96, left: 156 + vessel * SHELF.cell }}
              />
            ))}
          </div>
        ))}
        {[0, 1, 2, 3].map((row) => (
          <div key={row} className="my-4 h-24 rounded-card bg-line2 tablet:hidden" />
        ))}
      </div>
    </main>
  );
}
