'use client';
import { Button } from '@/components/ui/button';

/** The field of the thread, by its id: the bar's button takes one there. */
export const ASK_FIELD_ID = 'ask';

export function AskButton() {
  const go = () => {
    const field = document.getElementById(ASK_FIELD_ID);
    field?.scrollIntoView({ block: 'center' });
    field?.focus({ preventScroll: true });
  };
  return (
    <Button size="big" className="flex-[0_0_7rem]!" onClick={go}>
      Ask
    </Button>
  );
}
