'use client';
import { useRouter } from 'next/navigation';

import { useWrite } from '@/components/api/use-api';
import { FileUpload } from '@/components/files/file-upload';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { addInvoice, listInvoices } from '@/lib/invoices/contract';

/** An invoice that did not come through the processor's page: its file, or what stands on paper. */
export function TakeUp({ batchId }: { batchId: string }) {
  const router = useRouter();
  const write = useWrite(addInvoice, { refreshes: [listInvoices] });
  const takeUp = async (fileId: string | null) => {
    const done = await write
      .mutateAsync({ batchId, fileId })
      .catch((problem: unknown) =>
        showMessage({ says: problem instanceof Error ? problem.message : 'Not taken up.', failed: true }),
      );
    if (done) router.push(`/invoices/${done.id}`);
  };
  return (
    <div className="max-w-xl pt-3">
      <FileUpload
        purpose="invoice"
        batchId={batchId}
        label="Invoice"
        hint="PDF or picture, up to 50 MB"
        onArrived={(file) => void takeUp(file.id)}
      />
      <p className="pt-2">
        <Button look="word" onClick={() => takeUp(null)}>
          Enter it without a file
        </Button>
      </p>
    </div>
  );
}
