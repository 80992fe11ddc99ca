import type { ReactNode } from 'react';

import { QueryProvider } from '@/components/api/query-provider';

/** What one sees without having signed in; each page brings its own head, because a link's belongs to its shop. */
export default function PublicLayout({ children }: { children: ReactNode }) {
  return <QueryProvider>{children}</QueryProvider>;
}
