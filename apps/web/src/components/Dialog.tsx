import { Flex, chakra } from '@chakra-ui/react';
import { useId, useLayoutEffect, useRef, type ReactNode } from 'react';
import { TextButton } from './Button';

const NativeDialog = chakra('dialog', {
  base: {
    margin: 'auto',
    width: 'min(520px, calc(100vw - 24px))',
    maxHeight: 'calc(100dvh - 24px)',
    overflowY: 'auto',
    padding: { base: '18px 18px 22px', md: '24px 28px 28px' },
    bg: 'sheet',
    color: 'ink',
    // A dialog is no part of the line it was opened from.
    fontSize: 'body',
    fontWeight: 400,
    lineHeight: 1.45,
    textAlign: 'left',
    border: '2px solid',
    borderColor: 'ink',
    borderRadius: '3px',
    _backdrop: { bg: 'rgba(19, 21, 23, 0.55)' },
    _print: { display: 'none' },
  },
});

/**
 * A question in front of the page: the browser keeps the focus inside, Escape leaves it, and the focus goes back to
 * where it came from. Stands open for as long as it is rendered.
 */
export function Dialog({
  title,
  onClose,
  children,
}: {
  title: string;
  onClose: () => void;
  children: ReactNode;
}) {
  const dialog = useRef<HTMLDialogElement>(null);
  const headId = useId();
  useLayoutEffect(() => {
    const element = dialog.current;
    element?.showModal();
    return () => element?.close();
  }, []);
  return (
    <NativeDialog
      ref={dialog}
      aria-labelledby={headId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
    >
      <Flex justifyContent="space-between" alignItems="baseline" gap="16px">
        <chakra.h2 id={headId} fontSize="section" fontWeight={900} lineHeight="30px">
          {title}
        </chakra.h2>
        <TextButton type="button" fontSize="small" color="ink.muted" paddingY="8px" onClick={onClose}>
          close
        </TextButton>
      </Flex>
      {children}
    </NativeDialog>
  );
}
