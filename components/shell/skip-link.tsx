/** The first stop of the Tab key: past the masthead, to the content. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="sr-only z-50 rounded border border-cord bg-leaf px-3 py-2 font-semibold text-cord focus:not-sr-only focus:absolute focus:top-2 focus:left-2"
    >
      Skip to the content
    </a>
  );
}
