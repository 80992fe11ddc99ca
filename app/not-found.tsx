import { NotYours } from '@/components/shell/not-yours';
import { PublicHead } from '@/components/shell/public-head';

export default function NotFound() {
  return (
    <>
      <PublicHead />
      <main className="px-6 py-9 max-md:px-4">
        <NotYours />
      </main>
    </>
  );
}
