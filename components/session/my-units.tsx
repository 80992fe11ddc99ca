'use client';
import { useRouter } from 'next/navigation';

import { useWrite } from '@/components/api/use-api';
import { UnitsChoice, type Units } from '@/components/shell/units-choice';
import { showMessage } from '@/components/ui/message';
import { getAccount, updateAccount } from '@/lib/people/account-contract';
import { getMe } from '@/lib/session/contract';

/** How the reader takes lengths and temperatures; kept for every device of theirs. */
export function MyUnits({ units }: { units: Units }) {
  const router = useRouter();
  const write = useWrite(updateAccount, { refreshes: [getAccount, getMe] });
  const chosen = write.isPending || write.isSuccess ? (write.variables.units ?? units) : units;
  const choose = (next: Units) =>
    write.mutate(
      { units: next },
      {
        onSuccess: () => router.refresh(),
        onError: (error) => showMessage({ says: error.message, failed: true }),
      },
    );
  return <UnitsChoice units={chosen} onChoose={choose} />;
}
