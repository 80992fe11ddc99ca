'use client';
import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { getPayingMethod, linkPayingMethod } from '@/lib/payments/contract';

const EVERY_MS = 2_000;

/** How the shop pays. Its numbers are typed on the payment service's page and never pass through here. */
export function PayingMethod({ justSaved }: { justSaved: boolean }) {
  const { data, error } = useLazyRead(
    getPayingMethod,
    {},
    { refreshEveryMs: EVERY_MS * (justSaved ? 1 : 30) },
  );
  const link = useWrite(linkPayingMethod);
  const open = async () => {
    const page = await link.mutateAsync({}).catch((problem: unknown) =>
      showMessage({
        says: problem instanceof Error ? problem.message : 'The page could not be opened.',
        failed: true,
      }),
    );
    if (page) window.location.assign(page.url);
  };
  return (
    <>
      <PageHead
        title="How the shop pays"
        sub="Approved invoices are paid from one saved method, straight to the processor’s account."
      />
      <Section title="Saved method">
        {!data && !error && <Loading rows={1} label="Loading how the shop pays" />}
        {error && <Failing says="It could not be read." again={error.message} />}
        {data && (
          <p role="status" className="py-2">
            {data.saved ? (
              <>
                <strong>{data.says ?? 'A method is saved.'}</strong>{' '}
                {data.says === null && (
                  <span className="text-quiet">The payment service does not say which just now.</span>
                )}
              </>
            ) : (
              <>
                <strong>{justSaved ? 'Waiting for the payment service to confirm it.' : 'None yet.'}</strong>{' '}
                <span className="text-quiet">
                  {justSaved ? 'This page follows by itself.' : 'Until one is saved, approved invoices wait.'}
                </span>
              </>
            )}
          </p>
        )}
        <Button
          look={data?.saved ? 'outlined' : 'primary'}
          busy={link.isPending}
          busyLabel="Opening the page"
          onClick={open}
        >
          {data?.saved ? 'Save another' : 'Save a method'}
        </Button>
        <p className="pt-2 text-second text-quiet">
          It opens the payment service’s own page and comes back here. The method saved last is the one that
          pays.
        </p>
      </Section>
    </>
  );
}
