import { Flex, chakra } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { TextButton } from '../../../components/Button';

const BarButton = chakra(TextButton, {
  base: {
    minHeight: '44px',
    paddingX: '6px',
    _focusVisible: { outlineColor: 'sheet', outlineOffset: '-4px' },
  },
});

/** What was just done, and the way back; stays until it is dismissed. */
export function UndoBar({
  words,
  takesFocus,
  failure,
  onUndo,
  onDismiss,
}: {
  words: string;
  /** What had the focus is gone with the row; here is what one may want next. */
  takesFocus: boolean;
  failure: string;
  /** Absent where there is nothing to take back. */
  onUndo?: () => void;
  onDismiss: () => void;
}) {
  const undo = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (takesFocus) undo.current?.focus();
  }, [words, takesFocus]);
  return (
    <Flex
      role="status"
      position="sticky"
      bottom={{ base: '10px', lg: '18px' }}
      zIndex={3}
      marginTop="18px"
      width="fit-content"
      maxWidth="100%"
      alignItems="center"
      columnGap="12px"
      wrap="wrap"
      paddingX="18px"
      bg="ink"
      color="sheet"
      borderRadius="3px"
      _print={{ display: 'none' }}
    >
      <span>{failure || words}</span>
      {onUndo && (
        <BarButton ref={undo} fontWeight={600} onClick={onUndo}>
          Undo
        </BarButton>
      )}
      <BarButton ref={onUndo ? undefined : undo} fontSize="small" onClick={onDismiss}>
        Dismiss
      </BarButton>
    </Flex>
  );
}
