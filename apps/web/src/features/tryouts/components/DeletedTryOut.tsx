import { useEffect, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { UndoBar } from '../../takes/components/UndoBar';
import { useUndo } from '../../takes/hooks/useUndo';
import { useTryOutActions } from '../hooks/useTryOutActions';

/** The way back for a try-out that was deleted on its page. */
export function DeletedTryOut() {
  const { state } = useLocation() as { state: { deletedId?: string } | null };
  const deletedId = state?.deletedId;
  const { restore } = useTryOutActions();
  const navigate = useNavigate();
  const { undo, tell, ...bar } = useUndo();
  const told = useRef<string | null>(null);
  useEffect(() => {
    if (!deletedId || told.current === deletedId) return;
    told.current = deletedId;
    tell({
      words: 'The try-out is deleted. Its takes stay.',
      takesFocus: true,
      takeBack: { act: async () => void (await restore(deletedId)), words: 'The try-out is back.' },
    });
    // A reload doesn't tell it again.
    void navigate('.', { replace: true, state: null });
  }, [deletedId, tell, restore, navigate]);
  if (bar.words === null) return null;
  return <UndoBar {...bar} words={bar.words} onUndo={undo} onDismiss={bar.dismiss} />;
}
