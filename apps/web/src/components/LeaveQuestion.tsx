import { Box, Flex } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { Button } from './Button';

interface LeaveQuestionProps {
  /** "Files are still on their way." */
  strong: string;
  /** What leaving does. */
  rest: string;
  /** "Leave and stop them" */
  leaveWords: string;
  stay: () => void;
  leave: () => void;
}

/** Asked when somebody goes to another page and something would be lost. */
export function LeaveQuestion({ strong, rest, leaveWords, stay, leave }: LeaveQuestionProps) {
  const stayButton = useRef<HTMLButtonElement>(null);
  useEffect(() => stayButton.current?.focus(), []);
  return (
    <Flex
      role="alertdialog"
      aria-label={strong.replace(/\.$/, '')}
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
        <b>{strong}</b> {rest}
      </Box>
      <Flex gap="10px">
        <Button type="button" ref={stayButton} onClick={stay}>
          Stay here
        </Button>
        <Button type="button" look="outline" onClick={leave}>
          {leaveWords}
        </Button>
      </Flex>
    </Flex>
  );
}
