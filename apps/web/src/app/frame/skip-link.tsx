/** First stop of the Tab key: past the header, to what the page is about. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="absolute left-2 -top-12 z-50 rounded-xs bg-ink px-3 py-2 text-paper focus:top-2"
      onClick={(event) => {
        event.preventDefault();
        document.getElementById('main')?.focus();
      }}
    >
      Skip to the content
    </a>
  );
}
