import { Box, Flex, chakra } from '@chakra-ui/react';
import { paths, photoLimits, type SetupResponse } from '@thudline/contracts';
import { useEffect, useRef } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { useKeeping } from '../../../lib/useKeeping';
import { useSetupActions } from '../hooks/useSetupActions';

/** A photo of how it stood: added, shown, taken away again. */
export function PhotoPart({ setup, canChange }: { setup: SetupResponse; canChange: boolean }) {
  const { addPhoto, removePhoto } = useSetupActions();
  const { busy, failure, keep } = useKeeping();
  const input = useRef<HTMLInputElement>(null);
  const leaving = useRef(new AbortController());
  useEffect(() => {
    const controller = new AbortController();
    leaving.current = controller;
    return () => controller.abort();
  }, []);
  const { photo } = setup;
  const add = (file: File | undefined) =>
    file && void keep(() => addPhoto(setup.id, file, leaving.current.signal));
  return (
    <Box marginTop="12px">
      {photo && (
        <chakra.img
          src={paths.photo(photo.id)}
          alt={`How “${setup.name}” stood`}
          width={photo.widthPx}
          height={photo.heightPx}
          maxWidth="100%"
          maxHeight="320px"
          objectFit="contain"
          objectPosition="left"
          marginBottom="10px"
        />
      )}
      {canChange && (
        <Flex columnGap="18px" rowGap="4px" wrap="wrap" alignItems="baseline">
          <input
            ref={input}
            type="file"
            accept={photoLimits.types.join(',')}
            hidden
            aria-label="Photo of the setup"
            onChange={(event) => {
              add(event.target.files?.[0]);
              event.target.value = '';
            }}
          />
          <TextButton type="button" minHeight="32px" disabled={busy} onClick={() => input.current?.click()}>
            {busy ? 'One moment…' : photo ? 'Take another photo' : 'Add a photo'}
          </TextButton>
          {photo && (
            <TextButton
              type="button"
              minHeight="32px"
              disabled={busy}
              onClick={() => void keep(() => removePhoto(setup.id))}
            >
              Take it off
            </TextButton>
          )}
          <chakra.span fontSize="caption" color="ink.muted">
            Its place and date are taken out before it is kept.
          </chakra.span>
        </Flex>
      )}
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}
