'use client';
import { useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { PERMISSIONS, type Permission } from '@/lib/auth/permissions';
import type { Clock } from '@/lib/day-words';
import { getMe } from '@/lib/session/contract';

/** Who looks at the screen; undefined for the moment until it is known. */
export const useMe = () => useLazyRead(getMe, {}).data;

/** The shop's zone and the moment the page was drawn, for days in words. */
export function useClock(): Clock {
  const [now] = useState(() => new Date());
  return { zone: useMe()?.organisation.zone ?? 'UTC', now };
}

/** Whether to offer an action at all; whether it may be done is the server's to say. */
export function useMay(permission: Permission): boolean {
  const allowed: readonly string[] | 'everyone' = PERMISSIONS[permission];
  const roles = useMe()?.roles ?? [];
  return allowed === 'everyone' || roles.some((role) => allowed.includes(role));
}
