'use client';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';

import { useMe } from '@/components/session/use-me';
import { PERMISSIONS, type Permission } from '@/lib/auth/permissions';

const PAGES: readonly { says: string; href: string; permission: Permission }[] = [
  { says: 'My account', href: '/settings/account', permission: 'self.manage' },
  { says: 'Tokens', href: '/settings/tokens', permission: 'token.manage' },
  { says: 'Shop and policies', href: '/settings/shop', permission: 'shop.settings' },
  { says: 'How the shop pays', href: '/settings/payments', permission: 'shop.settings' },
  { says: 'People', href: '/settings/people', permission: 'people.manage' },
  { says: 'Tables of the trade', href: '/settings/tables', permission: 'reference.read' },
  { says: 'Audit trail', href: '/audit', permission: 'audit.read' },
  { says: 'Work that failed', href: '/jobs', permission: 'jobs.manage' },
  { says: 'The API', href: '/api-docs', permission: 'shop.read' },
];

/** Everything that is set or looked up rather than worked on, one list of words beside it. */
export function SettingsFrame({ children }: { children: ReactNode }) {
  const path = usePathname();
  const roles = useMe()?.roles ?? [];
  const pages = PAGES.filter(({ permission }) =>
    (PERMISSIONS[permission] as readonly string[]).some((role) => roles.some((mine) => mine === role)),
  );
  return (
    <div className="grid grid-cols-1 gap-x-9 lg:grid-cols-[11.5rem_minmax(0,1fr)]">
      <nav
        aria-label="Settings"
        className="flex flex-wrap gap-x-6 border-rule pt-4 max-lg:border-b max-lg:pb-1 max-md:-mx-4 max-md:flex-nowrap max-md:overflow-x-auto max-md:px-4 max-md:pt-1 lg:flex-col lg:pt-5"
      >
        {pages.map(({ says, href }) => (
          <Link
            key={href}
            href={href}
            aria-current={path === href ? 'page' : undefined}
            className={`flex flex-none items-center py-1.5 font-cond text-sub no-underline hover:text-ink touch:min-h-12 ${path === href ? 'text-ink underline decoration-2 underline-offset-4' : 'font-normal text-quiet'}`}
          >
            {says}
          </Link>
        ))}
      </nav>
      <div className="min-w-0">{children}</div>
    </div>
  );
}
