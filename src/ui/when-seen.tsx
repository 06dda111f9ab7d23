import { useEffect, useRef, useState, type ReactNode } from 'react';

/** Leaves its children out until the place scrolls near: for long lists whose rows are dear. `className` gives it its size beforehand. */
export function WhenSeen({ className, children }: { readonly className: string; readonly children: ReactNode }) {
  const place = useRef<HTMLDivElement>(null);
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    if (seen || place.current === null) return;
    const watch = new IntersectionObserver(
      (entries) => entries.some((entry) => entry.isIntersecting) && setSeen(true),
      { rootMargin: '200px' },
    );
    watch.observe(place.current);
    return () => watch.disconnect();
  }, [seen]);
  return (
    <div ref={place} className={className}>
      {seen && children}
    </div>
  );
}
