import { Loading } from '@/components/ui/loading';

export default function LoadingPage() {
  return (
    <div className="pt-16">
      <Loading rows={8} />
    </div>
  );
}
