'use client';
import type { ComponentProps } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { shopSections } from '@/components/shell/sections';
import { ShopShell } from '@/components/shell/shop-shell';
import { getWaiting } from '@/lib/tideline/contract';

/** What waits for somebody changes with what others do too. */
const LOOK_AGAIN_MS = 120_000;

type ShopFrameProps = Omit<ComponentProps<typeof ShopShell>, 'sections' | 'forMe'>;

/** The shop's head and bottom bar, with how much waits for the reader beside each section. */
export function ShopFrame(props: ShopFrameProps) {
  const { data } = useLazyRead(getWaiting, {}, { refreshEveryMs: LOOK_AGAIN_MS });
  return (
    <ShopShell {...props} sections={shopSections(props.roles, data?.sections)} forMe={data?.total ?? 0} />
  );
}
