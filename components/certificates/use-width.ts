'use client';
import { useEffect, useRef, useState } from 'react';

/** The width that an element has now, 0 until it is known. */
export function useElementWidth<Kind extends HTMLElement>() {
  const element = useRef<Kind>(null);
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const watched = element.current;
    if (!watched) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.floor(entry?.contentRect.width ?? 0)));
    observer.observe(watched);
    return () => observer.disconnect();
  }, []);
  return { element, width };
}
