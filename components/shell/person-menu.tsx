import type { ReactNode } from 'react';

interface PersonMenuProps {
  /** Over the name: the shop, or the processor. */
  organisation: string;
  person: string;
  roles: readonly string[];
  children: ReactNode;
}

const ID = 'person-menu';
const NAMED_AT_MOST = 2;

/** Whoever holds many roles is no better known by a cut list of them. */
const rolesWords = (roles: readonly string[]): string =>
  roles.length > NAMED_AT_MOST ? `, ${roles.length} roles` : roles.map((role) => `, ${role}`).join('');

/** The platform opens and closes it, so it works before any script has come. */
export function PersonMenu({ organisation, person, roles, children }: PersonMenuProps) {
  return (
    <>
      <button
        type="button"
        popoverTarget={ID}
        className="flex h-12 min-w-0 flex-col items-start justify-center border-l border-rule pl-3.5 text-left hover:bg-bench focus-visible:z-10 max-md:hidden"
      >
        <span className="max-w-52 truncate font-cond text-caption text-faint">{organisation}</span>
        <span className="max-w-52 truncate text-row font-medium">
          {person}
          {rolesWords(roles)}
        </span>
      </button>
      <div
        id={ID}
        popover="auto"
        aria-label={`${person}, choices`}
        role="dialog"
        className="fixed inset-auto top-12 right-6 m-0 max-h-[calc(100dvh-4rem)] w-80 overflow-y-auto border-heavy border-ink bg-paper p-4 text-ink"
      >
        {children}
      </div>
    </>
  );
}
