'use client';
import dynamic from 'next/dynamic';
import { useState, type ReactNode } from 'react';

import { Button } from '@/components/ui/button';

import { PageSpots, type PageSpotsProps } from './page-spots';
import { WordsPage } from './words-page';
import { usePaging, type Paging } from './use-paging';
import { useElementWidth } from './use-width';

// Drawing pages needs a browser; the server sends the frame only.
const PdfPage = dynamic(() => import('./pdf-page').then((module) => module.PdfPage), { ssr: false });

export interface ViewedFile {
  id: string;
  name: string;
  mediaType: string;
}

interface PageViewerProps {
  file: ViewedFile;
  title: ReactNode;
  /** Who sent it and when, its hash. */
  facts: ReactNode;
  /** Other files of the batch to look at: charts. */
  choice?: ReactNode;
  /** What was read on it, where something was. */
  read?: Read;
}

interface Read extends Omit<PageSpotsProps, 'page'> {
  pages: readonly PageSpotsProps['page'][];
  /** A page is on the screen: what points at it can find its place. */
  onDrawn: () => void;
}

/** A received file, page by page, as large as the room it has. */
export function PageViewer({ file, title, facts, choice, read }: PageViewerProps) {
  // A mail or a text has as many pages as its reader made of it; a PDF says itself how many it has.
  const paging = usePaging(isDrawn(file) ? null : (read?.pages.length ?? null));
  useTurnToLit(paging, read);
  const kept = read?.pages.find(({ number }) => number === paging.page);
  // Until its page is on the screen nothing can point at it.
  const [drawnPage, setDrawnPage] = useState<number | null>(null);
  const onDrawn = () => {
    setDrawnPage(paging.page);
    read?.onDrawn();
  };
  const { element, width } = useElementWidth<HTMLDivElement>();
  const isOnScreen = !isDrawn(file) || drawnPage === paging.page;
  const url = `/api/files/${file.id}/content?inline=1`;
  const drawn = Math.max(200, Math.floor((width - 36) * paging.zoom));
  return (
    <section aria-label={`File ${file.name}`} className="flex min-w-0 flex-col bg-deep">
      <div className="flex min-h-[38px] flex-wrap items-center gap-x-3.5 gap-y-1 border-b border-rule bg-bench py-1 pr-4 pl-6 text-string max-md:pl-4">
        <strong className="font-cond text-sub">{title}</strong>
        {facts}
      </div>
      <ViewerControls paging={paging} choice={choice} />
      <div
        ref={element}
        tabIndex={0}
        role="region"
        aria-label={`Page ${paging.page} of ${paging.pages}`}
        className="min-h-[320px] flex-1 overflow-auto max-lg:max-h-[60dvh]"
      >
        <div className="flex w-max min-w-full justify-center p-[18px]">
          <div className="relative" style={kept && isDrawn(file) ? roomFor(kept, drawn) : undefined}>
            {width > 0 && file.mediaType === 'application/pdf' && (
              <PdfPage
                url={url}
                page={paging.page}
                width={drawn}
                upright={kept?.turned ?? null}
                turned={paging.turned}
                onPages={paging.setPages}
                onDrawn={onDrawn}
              />
            )}
            {file.mediaType.startsWith('image/') && (
              // A received picture is shown from where it is kept; no copy of another size would be the original.
              // eslint-disable-next-line @next/next/no-img-element -- see above
              <img
                src={url}
                alt={`The received picture ${file.name}`}
                width={drawn}
                style={{ width: drawn, transform: `rotate(${paging.turned + (kept?.turned ?? 0)}deg)` }}
                className="lw-drawn h-auto max-w-none"
                onLoad={onDrawn}
              />
            )}
            {!isDrawn(file) &&
              (kept ? (
                <WordsPage page={kept} width={drawn} />
              ) : (
                <p className="p-6">
                  This file cannot be shown here. <a href={`/api/files/${file.id}/content`}>Save it</a>
                </p>
              ))}
            {read && kept && isOnScreen && paging.turned === 0 && isDrawnUpright(file, kept) && (
              <PageSpots
                page={kept}
                spots={read.spots}
                selected={read.selected}
                numberOf={read.numberOf}
                onRow={read.onRow}
                onWords={read.onWords}
              />
            )}
          </div>
        </div>
      </div>
    </section>
  );
}

const isDrawn = ({ mediaType }: ViewedFile): boolean =>
  mediaType === 'application/pdf' || mediaType.startsWith('image/');

/** Kept free while the page is still being drawn, so that what points at it stands where it will be. */
const roomFor = ({ width, height }: PageSpotsProps['page'], drawn: number) => ({
  minWidth: drawn,
  minHeight: Math.floor((drawn * height) / width),
});

/** A picture that was turned or straightened to be read has its words elsewhere than the picture shown. */
const isDrawnUpright = (file: ViewedFile, page: PageSpotsProps['page']): boolean =>
  !file.mediaType.startsWith('image/') || page.turned === 0;

/** The page on which the selected row stands comes up when the row is selected. */
function useTurnToLit({ toPage }: Paging, read: Read | undefined) {
  const lit = read?.spots.find(({ row }) => row === read.selected)?.page;
  // Only when another row is selected: who turns the page by hand stays there.
  const selection = `${read?.selected ?? ''} ${lit ?? ''}`;
  const [turnedFor, setTurnedFor] = useState(selection);
  if (selection === turnedFor) return;
  setTurnedFor(selection);
  if (lit !== undefined) toPage(lit);
}

function ViewerControls({ paging, choice }: { paging: Paging; choice: ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule bg-bench px-6 py-1 text-string max-md:px-4">
      <span className="flex items-center gap-2 whitespace-nowrap">
        <Button
          look="word"
          shortcut="["
          aria-label="Page before"
          onClick={() => paging.toPage(paging.page - 1)}
        >
          Before
        </Button>
        <span className="text-quiet" aria-live="polite">
          page <span className="num">{paging.page}</span> of <span className="num">{paging.pages}</span>
        </span>
        <Button
          look="word"
          shortcut="]"
          aria-label="Next page"
          onClick={() => paging.toPage(paging.page + 1)}
        >
          Next
        </Button>
      </span>
      <span className="flex items-center gap-3 whitespace-nowrap">
        <Button look="word" shortcut="+" aria-label="Nearer" onClick={paging.nearer}>
          Nearer
        </Button>
        <Button look="word" shortcut="-" aria-label="Further" onClick={paging.further}>
          Further
        </Button>
        <Button look="word" aria-label="Turn by a quarter" onClick={paging.turn}>
          Turn
        </Button>
        <Button look="word" onClick={paging.whole}>
          Whole page
        </Button>
      </span>
      {choice && <span className="ml-auto">{choice}</span>}
    </div>
  );
}
