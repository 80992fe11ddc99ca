import { Segments } from '@/components/ui/segments';

/** Lots and the parts they are made from are one section of the product. */
export function KindsSegments({ current }: { current: 'lots' | 'parts' }) {
  return (
    <Segments
      label="Parts and lots"
      items={[
        { says: 'Lots', href: '/lots', current: current === 'lots' },
        { says: 'Parts', href: '/parts', current: current === 'parts' },
      ]}
    />
  );
}
