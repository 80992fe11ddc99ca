'use client';

import { useEffect, useRef } from 'react';

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
      page.current.textContent = `${document.title}, ${window.location.pathname}, ${new Date().toLocaleString('en-GB')}`;
    };
    window.addEventListener('beforeprint', write);
    return () => window.removeEventListener('beforeprint', write);
  }, []);
  return (
    <div className="lw-print-foot mt-6 justify-between gap-4 border-t border-ink pt-1 text-source">
      <span>
        {organisation}. <span ref={page} />. {person}.
      </span>
      <span>printed copy</span>
    </div>
  );
}
