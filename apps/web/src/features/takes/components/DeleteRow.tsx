import { Flex } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../components/Button';
import { takeName } from '../rowWords';

/** Asks in the place of the row before a take goes. */
export function DeleteRow({
  take,
  onDelete,
  onKeep,
}: {
  take: TakeListItem;
  onDelete: () => Promise<void>;
  onKeep: () => void;
}) {
  const keep = useRef<HTMLButtonElement>(null);
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  useEffect(() => keep.current?.focus(), []);
  const remove = async () => {
    setBusy(true);
    setFailure('');
    try {
      await onDelete();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Deleting did not work. Try again.');
      setBusy(false);
    }
  };
  return (
    <Flex
      role="row"
      borderBottom="1px solid"
      borderColor="rule"
      bg="target"
      boxShadow="inset 3px 0 0 var(--chakra-colors-fix)"
      onKeyDown={(event) => event.key === 'Escape' && !busy && onKeep()}
    >
      <Flex
        role="cell"
        flex="1"
        minWidth={0}
        alignItems="center"
        wrap="wrap"
        columnGap="16px"
        rowGap="10px"
        paddingY={{ base: '14px', lg: '8px' }}
        paddingX="16px"
        fontSize="16px"
      >
        <span role="alert">
          {failure || (
            <>
              <b>Delete {takeName(take)}?</b> Its sheet and its files go with it.
            </>
          )}
        </span>
        <Flex gap="10px" marginLeft={{ base: 0, lg: 'auto' }}>
          <Button type="button" disabled={busy} onClick={() => void remove()}>
            {busy ? 'Deleting…' : 'Delete it'}
          </Button>
          <Button type="button" look="outline" ref={keep} disabled={busy} onClick={onKeep}>
            Keep it
          </Button>
        </Flex>
      </Flex>
    </Flex>
  );
}
