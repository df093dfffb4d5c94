import { chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';

export function AdminSection({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <chakra.section aria-labelledby={id} marginTop="30px">
      <chakra.h2 id={id} fontSize="section" fontWeight={900} lineHeight="30px" marginBottom="8px">
        {title}
      </chakra.h2>
      {children}
    </chakra.section>
  );
}
