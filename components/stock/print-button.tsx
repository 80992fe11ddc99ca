'use client';
import { Button } from '@/components/ui/button';

/** Opens the device's own print dialog, where the printer is chosen. */
export function PrintButton({
  says,
  look = 'primary',
}: {
  says: string;
  look?: 'primary' | 'outlined' | 'word';
}) {
  return (
    <Button look={look} onClick={() => window.print()}>
      {says}
    </Button>
  );
}
