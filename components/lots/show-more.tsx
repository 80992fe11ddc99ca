'use client';

import { useEffect, useRef } from 'react';
import { Button } from '@/components/ui/button';

interface ShowMoreProps {
  hasMore: boolean;
  busy: boolean;
  more: () => Promise<unknown>;
}

/** Reads on when its end comes into sight; the button is for keys and for those who want it. */
export function ShowMore({ hasMore, busy, more }: ShowMoreProps) {
  const end = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const seen = new IntersectionObserver(
      ([entry]) => {
        if (entry?.isIntersecting && hasMore && !busy) void more();
      },
      { rootMargin: '400px' },
    );
    if (end.current) seen.observe(end.current);
    return () => seen.disconnect();
  }, [hasMore, busy, more]);

  return (
    <div ref={end}>
      {hasMore && (
        <div className="pt-3">
          <Button
            size="small"
            busy={busy}
            busyLabel="Reading on"
            onClick={() => more().then(() => undefined)}
          >
            Show more
          </Button>
        </div>
      )}
    </div>
  );
}
