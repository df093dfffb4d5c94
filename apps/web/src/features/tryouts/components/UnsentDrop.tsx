import type { TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { useMe } from '../../auth/hooks/useMe';
import { DropAnywhere } from '../../upload/components/DropAnywhere';
import { readPickedFile } from '../../upload/readPickedFile';
import { newUploadKey } from '../../upload/uploadKey';
import { useSendPairs } from '../hooks/useSendQueue';
import { pairsToSendAgain } from '../upload/unsentPairs';

/** Takes the files of unsent pairs again, dropped anywhere on the page or chosen. */
export function UnsentDrop({ tryOut }: { tryOut: TryOutResponse }) {
  const { me } = useMe();
  const sendPairs = useSendPairs();
  const [problem, setProblem] = useState('');
  const bring = async (files: File[]) => {
    setProblem('');
    const picked = await Promise.all(
      files.map(async (file) => ({ id: newUploadKey(), file, reading: await readPickedFile(file) })),
    );
    const lengthUnit = me?.settings.lengthUnit ?? 'metre';
    const { pairs, strangers } = pairsToSendAgain(tryOut, picked, { lengthUnit, nowMs: Date.now() });
    if (pairs.length > 0) sendPairs(tryOut.id, pairs);
    else if (strangers.length > 0)
      setProblem(`These are other files: ${strangers.join(', ')}. Drop both files of a pair named above.`);
    else setProblem('These files can’t be read as WAV. Drop both files of a pair named above.');
  };
  return (
    <DropAnywhere onFiles={(files) => void bring(files)}>
      {(choose) => (
        <>
          <Button type="button" look="outline" onClick={() => choose()}>
            Choose files
          </Button>
          {problem && <FieldError>{problem}</FieldError>}
        </>
      )}
    </DropAnywhere>
  );
}
