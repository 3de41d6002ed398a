let isUnderWay = false;

/** Somebody signs out by hand: until the front page stands there, every way leads to it. */
export const leaving = {
  begin() {
    isUnderWay = true;
  },
  end() {
    isUnderWay = false;
  },
};

/** Where a page that needs a sign-in sends whoever has none. */
export const wayToSignIn = (next: string): string =>
  isUnderWay ? '/' : `/sign-in?next=${encodeURIComponent(next)}`;
