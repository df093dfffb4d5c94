import type { TryOutResponse } from '@thudline/contracts';
import { useCallback, useReducer, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { FileReading } from '../../upload/pickedFile';
import { newUploadKey } from '../../upload/uploadKey';
import type { LengthUnit } from '../positionWords';
import { draftReducer, emptyDraft } from '../upload/tryOutDraft';
import { draftProblem, tryOutPlan } from '../upload/tryOutRequest';
import { useReadFiles } from './useReadFiles';
import { useSendPairs } from './useSendQueue';
import { useTryOutActions } from './useTryOutActions';

interface DraftOf {
  takeIds: readonly string[];
  /** The try-out that gets more takes; null for a new one. */
  to: TryOutResponse | null;
  lengthUnit: LengthUnit;
}

/** Putting a try-out together, and making it: the pairs are then sent while its page is open. */
export function useTryOutDraft({ takeIds, to, lengthUnit }: DraftOf) {
  const [draft, dispatch] = useReducer(draftReducer, { takeIds, to }, (of) => emptyDraft(of.takeIds, of.to));
  const [problem, setProblem] = useState('');
  const [busy, setBusy] = useState(false);
  const { create, addPlaces } = useTryOutActions();
  const sendPairs = useSendPairs();
  const navigate = useNavigate();
  const onRead = useCallback(
    (id: string, reading: FileReading) => dispatch({ type: 'read', id, reading }),
    [dispatch],
  );
  useReadFiles(draft.files, onRead);

  const make = async () => {
    if (busy) return;
    const found = draftProblem(draft, lengthUnit);
    setProblem(found);
    if (found) return;
    setBusy(true);
    try {
      const { body, pairs } = tryOutPlan(draft, { lengthUnit, newKey: newUploadKey, nowMs: Date.now() });
      const tryOut = to ? await addPlaces(to.id, { places: body.places }) : await create(body);
      if (pairs.length > 0) sendPairs(tryOut.id, pairs);
      void navigate(`/tryouts/${tryOut.id}`, { replace: true });
    } catch (error) {
      setBusy(false);
      setProblem(error instanceof Error ? error.message : 'That did not work. Try again.');
    }
  };

  return {
    draft,
    dispatch,
    pick: (files: readonly File[]) => {
      setProblem('');
      if (files.length > 0)
        dispatch({ type: 'added', files: files.map((file) => ({ id: newUploadKey(), file })) });
    },
    problem,
    busy,
    make,
  };
}
