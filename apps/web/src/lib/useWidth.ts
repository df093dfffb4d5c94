import { useLayoutEffect, useRef, useState } from 'react';

/** The width of an element in px, followed while it changes; pictures are laid out in px so that text keeps its size. */
export function useWidth<T extends HTMLElement>(initialPx = 704) {
  const ref = useRef<T>(null);
  const [widthPx, setWidthPx] = useState(initialPx);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const read = () => {
      if (element.clientWidth > 0) setWidthPx(element.clientWidth);
    };
    read();
    const observer = new ResizeObserver(read);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return { ref, widthPx };
}
