import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router';

/**
 * After a step to another page, focus goes to that page's heading, so that a screen reader says where one is
 * and the keyboard goes on from there. Not on the first page of a visit, and not from under a person's hands.
 */
export function usePageFocus() {
  const heading = useRef<HTMLHeadingElement>(null);
  const location = useLocation();
  const first = location.key === 'default';
  useEffect(() => {
    const at = document.activeElement;
    const typing = at instanceof HTMLElement && at.closest('main') !== null && at.matches('input, select, textarea');
    if (!first && !typing) heading.current?.focus({ preventScroll: true });
  }, [location.pathname, first]);
  return heading;
}
