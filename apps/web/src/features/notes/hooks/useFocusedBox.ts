import { useEffect, useRef } from 'react';

/** @param wanted - whether the form's box takes the focus as it appears: somebody asked for it */
export function useFocusedBox(wanted: boolean) {
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (wanted) form.current?.querySelector('textarea')?.focus();
  }, [wanted]);
  return form;
}
