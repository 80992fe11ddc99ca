import { NotYours } from '@/components/shell/not-yours';

/** Within the shop's own head. */
export default function NotFound() {
  return (
    <div className="py-6">
      <NotYours />
    </div>
  );
}
