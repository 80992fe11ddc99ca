'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { sectionOf, type SectionLink } from './sections';

interface BottomBarProps {
  sections: readonly SectionLink[];
  /** How many things wait for me. */
  forMe: number;
  forMeHref?: string;
  /** `<ScanSheet>`'s button. */
  scan: ReactNode;
  /** `<PersonPanel>`, under the sections. */
  personPanel: ReactNode;
  organisation: string;
  person: string;
}

const MORE_ID = 'more-sections';
const CELL =
  'relative flex items-center justify-center gap-2 border-l border-rule text-sub font-cond no-underline focus-visible:z-10';

/** On a phone: four things within reach of a thumb. */
export function BottomBar(props: BottomBarProps) {
  const { sections, forMe, forMeHref = '/#for-me', scan, personPanel, organisation, person } = props;
  const open = sectionOf(usePathname(), sections);
  const home = sections[0];
  const atHome = home !== undefined && home === open;
  return (
    <nav
      aria-label="Main"
      className="lw-bottom fixed inset-x-0 bottom-0 z-30 grid h-[60px] grid-cols-[1fr_1fr_1.2fr_1fr] border-t-heavy border-ink bg-paper md:hidden"
    >
      {home && (
        <Link
          href={home.href}
          aria-current={atHome ? 'page' : undefined}
          className={`${CELL} border-l-0 ${atHome ? 'text-ink before:absolute before:inset-x-0 before:top-0 before:h-1 before:bg-ink' : 'text-quiet'}`}
        >
          {home.says}
        </Link>
      )}
      <Link href={forMeHref} className={`${CELL} text-quiet`}>
        For me
        {forMe > 0 && <span className="num font-semibold text-held-ink">{forMe}</span>}
      </Link>
      {scan}
      <button type="button" popoverTarget={MORE_ID} className={`${CELL} text-quiet`}>
        More
      </button>
      <div
        id={MORE_ID}
        popover="auto"
        role="dialog"
        aria-label="More sections"
        className="fixed inset-x-0 top-auto bottom-[60px] m-0 max-h-[calc(100dvh-8rem)] w-full max-w-none overflow-y-auto border-x-0 border-y-heavy border-ink bg-paper p-4 text-ink"
      >
        <nav aria-label="All sections" className="pb-4">
          {sections.map((section) => (
            <Link
              key={section.href}
              href={section.href}
              onClick={(event) => event.currentTarget.closest<HTMLElement>('[popover]')?.hidePopover()}
              aria-current={section === open ? 'page' : undefined}
              className="flex min-h-12 items-center gap-2 border-b border-rule font-cond text-sub no-underline aria-[current]:border-ink"
            >
              {section.says}
              {section.count ? (
                <span className="num font-semibold text-held-ink">{section.count}</span>
              ) : null}
            </Link>
          ))}
        </nav>
        <p className="pb-2">
          <span className="font-cond text-caption text-faint">{organisation}</span> {person}
        </p>
        {personPanel}
      </div>
    </nav>
  );
}
