import { Box, Flex, chakra } from '@chakra-ui/react';
import { paths, photoLimits, type PhotoResponse } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { TextButton } from './Button';
import { FieldError } from './FieldError';

interface PhotoFieldProps {
  photo: PhotoResponse | null;
  /** What it shows. */
  alt: string;
  /** Of the file to choose: "Photo of the room". */
  label: string;
  canChange: boolean;
  onAdd: (file: File, signal: AbortSignal) => Promise<unknown>;
  onRemove: () => Promise<unknown>;
}

/** A photo: added, shown, taken away again. */
export function PhotoField({ photo, alt, label, canChange, onAdd, onRemove }: PhotoFieldProps) {
  const { busy, failure, act } = useOneAct();
  const input = useRef<HTMLInputElement>(null);
  const leaving = useRef(new AbortController());
  useEffect(() => {
    const controller = new AbortController();
    leaving.current = controller;
    return () => controller.abort();
  }, []);
  const add = (file: File | undefined) => file && void act(() => onAdd(file, leaving.current.signal));
  return (
    <Box>
      {photo && (
        <chakra.img
          src={paths.photo(photo.id)}
          alt={alt}
          width={photo.widthPx}
          height={photo.heightPx}
          maxWidth="100%"
          maxHeight="320px"
          objectFit="contain"
          objectPosition="left"
          marginBottom="6px"
        />
      )}
      {canChange && (
        <Flex
          columnGap="18px"
          wrap="wrap"
          alignItems="baseline"
          fontSize="small"
          _print={{ display: 'none' }}
        >
          <input
            ref={input}
            type="file"
            accept={photoLimits.types.join(',')}
            hidden
            aria-label={label}
            onChange={(event) => {
              add(event.target.files?.[0]);
              event.target.value = '';
            }}
          />
          <TextButton type="button" minHeight="32px" disabled={busy} onClick={() => input.current?.click()}>
            {busy ? 'One moment…' : photo ? 'take another photo' : 'add a photo'}
            <chakra.span srOnly>: {label}</chakra.span>
          </TextButton>
          {photo && (
            <TextButton type="button" minHeight="32px" disabled={busy} onClick={() => void act(onRemove)}>
              take it off<chakra.span srOnly>: {label}</chakra.span>
            </TextButton>
          )}
        </Flex>
      )}
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}

function useOneAct() {
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const act = async (work: () => Promise<unknown>) => {
    setBusy(true);
    setFailure('');
    try {
      await work();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return { busy, failure, act };
}
