import { Box, Flex } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { Button } from '../../../components/Button';
import type { NewTake } from '../hooks/useNewTake';

/** Asked when somebody goes to another page while files are on their way. */
export function LeaveQuestion({ stay, leave }: Omit<NewTake['leaving'], 'asking'>) {
  const stayButton = useRef<HTMLButtonElement>(null);
  useEffect(() => stayButton.current?.focus(), []);
  return (
    <Flex
      role="alertdialog"
      aria-label="Files are still on their way"
      position="fixed"
      zIndex={15}
      left={{ base: '12px', md: '50%' }}
      right={{ base: '12px', md: 'auto' }}
      bottom="24px"
      width={{ md: 'max-content' }}
      transform={{ base: 'none', md: 'translateX(-50%)' }}
      alignItems="center"
      wrap="wrap"
      columnGap="18px"
      rowGap="12px"
      padding="16px 20px"
      bg="sheet"
      border="2px solid"
      borderColor="ink"
      borderRadius="3px"
      onKeyDown={(event) => event.key === 'Escape' && stay()}
    >
      <Box>
        <b>Files are still on their way.</b> Leaving stops them.
      </Box>
      <Flex gap="10px">
        <Button type="button" ref={stayButton} onClick={stay}>
          Stay here
        </Button>
        <Button type="button" look="outline" onClick={leave}>
          Leave and stop them
        </Button>
      </Flex>
    </Flex>
  );
}
