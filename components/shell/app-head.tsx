import Link from 'next/link';
import type { ReactNode } from 'react';
import { BrandMark } from '@/components/ui/marks';
import { PersonMenu } from './person-menu';
import { SectionNav } from './section-nav';
import type { SectionLink } from './sections';

export interface AppHeadProps {
  /** The shop, or the processor on its own side. */
  organisation: string;
  person: string;
  roles: readonly string[];
  sections: readonly SectionLink[];
  /** `<NumberField search={…} />`, bound to the search by a client component of its own. */
  numberField: ReactNode;
  /** `<PersonPanel>` */
  personPanel: ReactNode;
  home?: string;
}

/** 48 px: mark, sections, one field for any number, shop and person. */
export function AppHead({
  organisation,
  person,
  roles,
  sections,
  numberField,
  personPanel,
  home = '/',
}: AppHeadProps) {
  return (
    <header className="lw-head flex flex-wrap items-stretch border-b-heavy border-ink bg-paper px-6 max-md:px-4">
      <Link
        href={home}
        className="flex h-12 items-center gap-2 pr-5 font-cond text-[1.25rem] leading-none font-bold no-underline"
      >
        <BrandMark />
        <span className="max-md:sr-only">Lotwright</span>
      </Link>
      <SectionNav sections={sections} />
      <div className="flex h-12 items-center px-3.5 max-lg:ml-auto max-md:w-full max-md:flex-1 max-md:px-0">
        <div className="w-59 max-xl:w-44 max-md:w-full">{numberField}</div>
      </div>
      <PersonMenu organisation={organisation} person={person} roles={roles}>
        {personPanel}
      </PersonMenu>
    </header>
  );
}
