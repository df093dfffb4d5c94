import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { AuthSheet } from './AuthSheet';

/** A link of a mail that no longer opens anything, and the next step. */
export function LinkEnded({ children }: { children: ReactNode }) {
  return (
    <AuthSheet
      strong="This link has ended."
      rest="It opens once, and not for long."
      margin={[{ title: 'Several mails?', text: 'Only the link in the newest one works.' }]}
    >
      <chakra.div role="alert">{children}</chakra.div>
    </AuthSheet>
  );
}
