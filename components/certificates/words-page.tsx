import type { KeptPage } from '@/lib/readings/kept-reading';

/** A page that is words only, a mail or a text: each word where the reader laid it. */
export function WordsPage({ page, width }: { page: KeptPage; width: number }) {
  const scale = width / page.width;
  return (
    <div className="lw-sheet relative bg-white" style={{ width, height: page.height * scale }}>
      {page.words.map(([text, left, top, right, bottom], at) => (
        <span
          key={at}
          className="absolute font-mono leading-none whitespace-pre text-[#1e2326]"
          style={{
            left: left * scale,
            top: top * scale,
            width: (right - left) * scale,
            fontSize: (bottom - top) * scale * 0.95,
          }}
        >
          {text}
        </span>
      ))}
    </div>
  );
}
