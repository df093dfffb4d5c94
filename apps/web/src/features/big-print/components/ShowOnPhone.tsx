import { lazy, Suspense, useState } from 'react';
import { TextButton } from '../../../components/Button';

const PhoneDialog = lazy(async () => ({ default: (await import('./PhoneDialog')).PhoneDialog }));

/** Opens a code to scan that shows Big print on a phone. */
export function ShowOnPhone({ children = 'Show on my phone' }: { children?: string }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <TextButton type="button" paddingY="8px" onClick={() => setOpen(true)}>
        {children}
      </TextButton>
      {open && (
        <Suspense>
          <PhoneDialog onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}
