/** The first thing on every page for those who use a keyboard. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="no-print fixed top-2 left-2 z-50 -translate-y-24 rounded-control bg-ink px-4 py-2 font-semibold text-paper focus:translate-y-0"
    >
      Skip to the main part
    </a>
  )
}
