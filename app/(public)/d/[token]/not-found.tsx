import { DossierLinkEnded } from '@/components/dossiers/dossier-link-ended';
import { PublicHead } from '@/components/shell/public-head';

export default function DossierLinkNotFound() {
  return (
    <>
      <PublicHead />
      <main className="mx-auto max-w-[46rem] px-4 py-6">
        <DossierLinkEnded state="unknown" shop={null} phone={null} zone={null} endedAt={null} />
      </main>
    </>
  );
}
