import { Segments } from '@/components/ui/segments';

/** What lies in the stores, and where it can lie. */
export function StockSegments({ current }: { current: 'stock' | 'places' }) {
  return (
    <Segments
      label="Stock and places"
      items={[
        { says: 'Stock', href: '/stock', current: current === 'stock' },
        { says: 'Places', href: '/stock/places', current: current === 'places' },
      ]}
    />
  );
}
