/** First stop of the Tab key; seen only while it has the focus. */
export function SkipLink() {
  return (
    <a
      href="#main"
      onClick={(event) => {
        event.preventDefault();
        const main = document.getElementById('main');
        main?.setAttribute('tabindex', '-1');
        main?.focus();
      }}
      className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:rounded-lg focus:bg-white focus:px-4 focus:py-2 focus:font-semibold focus:text-ink"
    >
      Skip to the page
    </a>
  );
}
