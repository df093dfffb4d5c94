import { Box, Flex } from '@chakra-ui/react';
import { useState, type FormEvent, type ReactNode } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextArea } from '../../../components/TextArea';
import { ApiError } from '../../../lib/apiClient';
import { useFocusedBox } from '../hooks/useFocusedBox';
import { ItemFields } from './ItemFields';

export interface Draft {
  body: string;
  nextItems: string[];
}

interface NoteFormProps {
  /** Names the box, and stands above it. */
  label: string;
  send: string;
  start?: Draft;
  /** What it is about, to choose. */
  about?: ReactNode;
  /** Whose list things to do go on; left out for those who may not ask for any. */
  listOf?: string;
  /** Who reads it, and what follows. */
  remark?: ReactNode;
  onSend: (draft: Draft) => Promise<unknown>;
  /** Left out where the box always stands there. */
  onLeave?: () => void;
  autoFocus?: boolean;
  /** As wide as the sheet's body. */
  wide?: boolean;
}

/** A box to write in: words, and what to do before the next take. */
export function NoteForm({ label, send, start, about, listOf, remark, ...props }: NoteFormProps) {
  const { onSend, onLeave, autoFocus = false, wide = false } = props;
  const [body, setBody] = useState(start?.body ?? '');
  const [items, setItems] = useState(start?.nextItems ?? []);
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const form = useFocusedBox(autoFocus);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    setFailure('');
    try {
      await onSend({ body, nextItems: items.map((item) => item.trim()).filter(Boolean) });
      setBody('');
      setItems([]);
    } catch (error) {
      setFailure(error instanceof ApiError ? error.message : 'It could not be sent. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <Box
      as="form"
      ref={form}
      aria-label={label}
      onSubmit={(event: FormEvent) => void submit(event)}
      _print={{ display: 'none' }}
    >
      {about}
      <Box
        marginTop="6px"
        onKeyDown={(event) => {
          if (event.key === 'Escape' && onLeave && body === (start?.body ?? '')) onLeave();
          if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) form.current?.requestSubmit();
        }}
      >
        <TextArea
          label={label}
          value={body}
          onChange={setBody}
          maxLength={4000}
          required
          rows={wide ? 4 : 2}
        />
      </Box>
      {listOf && <ItemFields {...{ listOf, items }} onChange={setItems} />}
      {failure && <FieldError>{failure}</FieldError>}
      <Flex gap="10px" marginTop="12px" wrap="wrap">
        <Button type="submit" disabled={busy} width={wide ? { base: '100%', lg: 'auto' } : undefined}>
          {send}
        </Button>
        {onLeave && (
          <Button type="button" look="plain" onClick={onLeave}>
            Leave it
          </Button>
        )}
      </Flex>
      {remark && (
        <Box fontSize="caption" lineHeight="19px" color="ink.muted" marginTop="8px">
          {remark}
        </Box>
      )}
    </Box>
  );
}
