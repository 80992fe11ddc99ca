import type { KeptPage } from '@/lib/readings/kept-reading';

/** How much of its own size a letter of our typewriter face is wide. */
const LETTER_WIDTH = 0.6;

/** A page that is words only, a mail or a text: each word where the reader laid it, as wide as it was laid. */
export function WordsPage({ page, width }: { page: KeptPage; width: number }) {
  const scale = width / page.width;
  return (
    <div className="lw-sheet relative bg-white" style={{ width, height: page.height * scale }}>
      {page.words.map(([text, left, top, right, bottom], at) => (
        <span
          key={at}
          className="absolute font-mono whitespace-pre text-[#1e2326]"
          style={{
            left: left * scale,
            top: top * scale,
            width: (right - left) * scale,
            fontSize: ((right - left) * scale) / (text.length * LETTER_WIDTH),
            lineHeight: `${(bottom - top) * scale}px`,
          }}
        >
          {text}
        </span>
      ))}
    </div>
  );
}
