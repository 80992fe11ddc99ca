import type { ReactNode } from 'react';

import { QueryProvider } from '@/components/api/query-provider';

/** The processor's side. Each page brings its head: a batch shows its shop, the work list the processor itself. */
export default function PortalLayout({ children }: { children: ReactNode }) {
  return <QueryProvider>{children}</QueryProvider>;
}
