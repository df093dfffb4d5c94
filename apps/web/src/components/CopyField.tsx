import { Box, Flex } from '@chakra-ui/react';
import { useRef, useState } from 'react';
import { Button } from './Button';
import { TextField } from './TextField';

/** An address to hand on: a button copies it; where the browser won't, it is selected to be copied by hand. */
export function CopyField({ label, value }: { label: string; value: string }) {
  const box = useRef<HTMLDivElement>(null);
  const [outcome, setOutcome] = useState<'' | 'copied' | 'selected'>('');
  const select = () => box.current?.querySelector('input')?.select();
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(value);
      setOutcome('copied');
    } catch {
      select();
      setOutcome('selected');
    }
  };
  return (
    <Box ref={box}>
      <Flex gap="14px" alignItems="flex-end">
        <Box flex="1" minWidth={0}>
          <TextField label={label} value={value} onChange={() => undefined} readOnly onFocus={select} />
        </Box>
        <Button type="button" onClick={() => void copy()}>
          {outcome === 'copied' ? 'Copied' : 'Copy'}
        </Button>
      </Flex>
      <Box role="status" fontSize="caption" color="ink.muted" minHeight="20px" marginTop="4px">
        {outcome === 'copied' && 'Copied. Paste it where you want it.'}
        {outcome === 'selected' && 'The browser did not copy it. It is selected now: copy it by hand.'}
      </Box>
    </Box>
  );
}
