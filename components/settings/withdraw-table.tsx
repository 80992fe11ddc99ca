'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { showMessage } from '@/components/ui/message';
import {
  getReferenceTable,
  getTablesInForce,
  listReferenceTables,
  withdrawOwnTable,
  type ReferenceTable,
  type TableEntry,
} from '@/lib/reference/contract';
import { documentOf } from '@/lib/reference/own-table';

/** Takes the shop's own edition out of force, once that was confirmed. */
export function WithdrawTable({ table, entry }: { table: ReferenceTable; entry: TableEntry }) {
  const [open, setOpen] = useState(false);
  const write = useWrite(withdrawOwnTable, {
    refreshes: [getReferenceTable, listReferenceTables, getTablesInForce],
  });
  const withdraw = () =>
    write.mutateAsync({ tableId: table.tableId, entryId: entry.id }).then(
      () => {
        setOpen(false);
        showMessage({ says: `${documentOf(entry)} is withdrawn. The published table is in force.` });
      },
      (error: unknown) =>
        showMessage({ says: error instanceof Error ? error.message : 'It was not withdrawn.', failed: true }),
    );
  return (
    <>
      <Button onClick={() => setOpen(true)}>Withdraw your edition</Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        busy={write.isPending}
        title={`Withdraw ${documentOf(entry)}`}
        lead={`From now on answers are read from the published table again: ${table.published}. What was frozen stays as it is, and your edition is kept among the earlier ones.`}
        onSubmit={withdraw}
        actions={
          <>
            <Button look="stop" type="submit" busy={write.isPending} busyLabel="Withdrawing">
              Withdraw the edition
            </Button>
            <Button onClick={() => setOpen(false)}>Leave it in force</Button>
          </>
        }
      />
    </>
  );
}
