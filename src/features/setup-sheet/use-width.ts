import { useLayoutEffect, useRef, useState } from 'react';

/** Width of an element in CSS pixels, as it is laid out; `before` until it is. */
export function useWidth<E extends HTMLElement>(before: number) {
  const ref = useRef<E>(null);
  const [width, setWidth] = useState(before);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null) return;
    const measure = () => element.clientWidth > 0 && setWidth(element.clientWidth);
    measure();
    const watch = new ResizeObserver(measure);
    watch.observe(element);
    return () => watch.disconnect();
  }, []);
  return { ref, width };
}
