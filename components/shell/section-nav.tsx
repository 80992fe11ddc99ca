'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { sectionOf, type SectionLink } from './sections';

/** The sections as plain words; the one that is open stands on a bar. */
export function SectionNav({ sections }: { sections: readonly SectionLink[] }) {
  const open = sectionOf(usePathname(), sections);
  return (
    <nav
      aria-label="Main"
      className="flex flex-1 gap-0.5 border-rule font-cond text-[0.9375rem] leading-none max-lg:order-last max-lg:w-full max-lg:flex-none max-lg:flex-wrap max-lg:border-t max-md:hidden lg:border-l lg:pl-2.5"
    >
      {sections.map((section) => {
        const current = section === open;
        return (
          <Link
            key={section.href}
            href={section.href}
            aria-current={current ? 'page' : undefined}
            {...(section.letter
              ? { 'data-key': `g ${section.letter.toLowerCase()}`, 'data-key-says': section.says }
              : {})}
            className={`relative flex h-12 items-center gap-1.5 px-2.5 whitespace-nowrap no-underline hover:text-ink focus-visible:z-10 max-xl:px-1.5 ${
              current
                ? 'font-semibold text-ink after:absolute after:inset-x-2.5 after:-bottom-[1.5px] after:h-1 after:bg-ink max-xl:after:inset-x-1.5'
                : 'font-medium text-quiet'
            }`}
          >
            {section.says}
            {section.count ? (
              <span className="num text-[0.75rem] font-semibold text-held-ink">
                {section.count}
                <span className="sr-only"> wait for me</span>
              </span>
            ) : null}
          </Link>
        );
      })}
    </nav>
  );
}
