import { Flex } from '@chakra-ui/react';
import type { ShareKind } from '@thudline/contracts';
import { CheckBox } from '../../../components/CheckBox';
import type { ShareDraft } from '../shareDraft';

interface ShareRightsProps {
  kind: ShareKind;
  draft: ShareDraft;
  onChange: (changed: Partial<ShareDraft>) => void;
}

/** What whoever holds the link may do beyond reading. Files and notes belong to a take; a log has no sound. */
export function ShareRights({ kind, draft, onChange }: ShareRightsProps) {
  if (kind === 'room') return null;
  return (
    <Flex direction="column" gap="10px" marginTop="16px">
      <CheckBox checked={draft.canListen} onChange={(canListen) => onChange({ canListen })}>
        They may listen
      </CheckBox>
      {kind === 'take' && (
        <>
          <CheckBox checked={draft.canNote} onChange={(canNote) => onChange({ canNote })}>
            They may leave notes
          </CheckBox>
          <CheckBox checked={draft.canDownload} onChange={(canDownload) => onChange({ canDownload })}>
            They may download the files
          </CheckBox>
        </>
      )}
    </Flex>
  );
}
