export function SkipLink() {
  return (
    <a
      href="#page"
      className="no-print absolute top-1 left-4 z-50 -translate-y-16 bg-ink px-4 py-2 font-cond text-sub text-paper focus:translate-y-0"
    >
      To the page
    </a>
  );
}
