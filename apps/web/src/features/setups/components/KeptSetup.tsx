import type { SetupResponse, UserSettings } from '@thudline/contracts';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/Button';
import { TextLink } from '../../../components/TextLink';
import { useKeeping } from '../../../lib/useKeeping';
import { onPurpose } from '../../../lib/useLeaveGuard';
import { useSetupActions } from '../hooks/useSetupActions';
import { fieldsOf, useSetupDraft } from '../hooks/useSetupDraft';
import { agreementWords, takesOfSetup, usedWords } from '../setupWords';
import { PhotoPart } from './PhotoPart';
import { SetupButtons } from './SetupButtons';
import { SetupOverTime } from './SetupOverTime';
import { SetupSheet } from './SetupSheet';
import { UnkeptQuestion } from './UnkeptQuestion';

/** A setup that is kept: corrected here, copied where something was moved. */
export function KeptSetup({
  setup,
  settings,
  canChange,
}: {
  setup: SetupResponse;
  settings: UserSettings;
  canChange: boolean;
}) {
  const draft = useSetupDraft(fieldsOf(setup));
  const { update, remove } = useSetupActions();
  const { busy, failure, isKept, keep } = useKeeping();
  const navigate = useNavigate();
  const copy = () =>
    void navigate(`/setups/new?from=${setup.id}`, { state: { fields: draft.fields, ...onPurpose } });
  const removeIt = () =>
    keep(async () => {
      await remove(setup.id);
      await navigate('/setups', { state: onPurpose });
    });
  const state = draft.isChanged ? 'Not kept yet.' : isKept ? 'Kept.' : '';
  return (
    <SetupSheet
      {...{ draft, settings }}
      measured={setup.measured}
      caption={<SetupCaption setup={setup} />}
      says={agreementWords(draft.fields, setup.measured, settings)}
      photo={
        <>
          <PhotoPart setup={setup} canChange={canChange} />
          <SetupOverTime setup={setup} />
        </>
      }
      buttons={
        canChange && (
          <SetupButtons
            {...{ busy, failure, state }}
            onKeep={() => void keep(() => update(setup.id, draft.fields))}
            note={
              setup.takeCount > 0 &&
              draft.isChanged &&
              `${usedWords(setup).replace(/^used/, 'Used')}, which will say the new numbers too: right for a mistake. Where you moved something, copy it with changes.`
            }
          >
            <Button type="button" look="outline" onClick={copy}>
              Copy with changes
            </Button>
            <UnkeptQuestion isChanged={draft.isChanged} />
            {setup.takeCount === 0 && (
              <Button type="button" look="plain" aria-disabled={busy} onClick={() => void removeIt()}>
                Remove it
              </Button>
            )}
          </SetupButtons>
        )
      }
    />
  );
}

function SetupCaption({ setup }: { setup: SetupResponse }) {
  const { copiedFrom, takeCount, id } = setup;
  return (
    <>
      <TextLink to="/setups">Setups</TextLink> ·{' '}
      {takeCount > 0 ? <TextLink to={takesOfSetup(id)}>{usedWords(setup)}</TextLink> : usedWords(setup)}
      {copiedFrom && (
        <>
          {' '}
          · copied from “<TextLink to={`/setups/${copiedFrom.id}`}>{copiedFrom.name}</TextLink>”
        </>
      )}
    </>
  );
}
