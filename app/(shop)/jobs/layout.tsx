import type { ReactNode } from 'react';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { SettingsFrame } from '@/components/settings/settings-frame';
import { getMeEndpoint } from '@/lib/session/endpoints';

export default function JobsLayout({ children }: { children: ReactNode }) {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {})]}>
      <SettingsFrame>{children}</SettingsFrame>
    </Prefetched>
  );
}
