'use client';

import { useEffect, useRef } from 'react';

import { momentWords } from '@/lib/day-words';

interface PrintFootProps {
  organisation: string;
  person: string;
}

/** Only on paper: whose page, which, by whom, when, and that it is a copy. */
export function PrintFoot({ organisation, person }: PrintFootProps) {
  const page = useRef<HTMLSpanElement>(null);
  useEffect(() => {
    const write = () => {
      if (!page.current) return;
      const [now, zone] = [new Date(), Intl.DateTimeFormat().resolvedOptions().timeZone];
      page.current.textContent = `${document.title}, ${window.location.pathname}, ${momentWords(now, { zone, now })}`;
    };
    window.addEventListener('beforeprint', write);
    return () => window.removeEventListener('beforeprint', write);
  }, []);
  return (
    <div className="lw-print-foot mt-6 justify-between gap-4 border-t border-ink pt-1 text-source">
      <span>
        {organisation}. <span ref={page} />. {person}.
      </span>
      <span className="whitespace-nowrap">printed copy</span>
    </div>
  );
}
