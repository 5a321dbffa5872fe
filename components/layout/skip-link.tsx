/** First stop of the keyboard: past the navigation to what the page is about. */
export function SkipLink() {
  return (
    <a
      href="#content"
      className="sr-only z-50 touch bg-action px-4 py-3 font-semibold text-on-action focus:not-sr-only focus:fixed focus:top-2 focus:left-2"
    >
      Skip to the content
    </a>
  );
}
