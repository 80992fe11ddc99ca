import { Button } from '@/components/ui/button';

interface ChartControlsProps {
  onNearer: () => void;
  onFurther: () => void;
  onWhole: () => void;
  /** One event back or on. */
  onEvent: (by: 1 | -1) => void;
}

/** What a finger needs, and the keys of the page: in the chart itself the same keys and the arrows work too. */
export function ChartControls({ onNearer, onFurther, onWhole, onEvent }: ChartControlsProps) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 pt-1 text-string print:hidden">
      <Button look="word" shortcut="+" onClick={onNearer}>
        Nearer
      </Button>
      <Button look="word" shortcut="-" onClick={onFurther}>
        Further
      </Button>
      <Button look="word" shortcut="0" onClick={onWhole}>
        Whole run
      </Button>
      <Button look="word" shortcut="[" onClick={() => onEvent(-1)}>
        Event before
      </Button>
      <Button look="word" shortcut="]" onClick={() => onEvent(1)}>
        Next event
      </Button>
    </div>
  );
}
