import { useEffect, useRef } from 'react';

/** After a try that found wrong fields, focus goes to the first of them in the form. `wrong` is a new object with each try. */
export function useFocusOnWrong(wrong: object) {
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    form.current?.querySelector<HTMLElement>('[aria-invalid=true]')?.focus();
  }, [wrong]);
  return form;
}
