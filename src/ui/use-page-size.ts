import { useLayoutEffect, useState, type RefObject } from 'react';

/** Room in pixels. */
interface Size {
  readonly width: number;
  readonly height: number;
}

/** Size of an element in whole pixels, followed as the window changes; null before it is known. */
export function usePageSize(element: RefObject<Element | null>): Size | null {
  const [size, setSize] = useState<Size | null>(null);
  useLayoutEffect(() => {
    const observed = element.current;
    if (!observed) return;
    const read = () => {
      const { width, height } = observed.getBoundingClientRect();
      const next = { width: Math.round(width), height: Math.round(height) };
      setSize((now) => (now?.width === next.width && now.height === next.height ? now : next));
    };
    read();
    const observer = new ResizeObserver(read);
    observer.observe(observed);
    return () => observer.disconnect();
  }, [element]);
  return size;
}
