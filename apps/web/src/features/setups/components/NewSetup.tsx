import { emptySetup, type NamedSetup, type SetupFields, type UserSettings } from '@thudline/contracts';
import { useNavigate } from 'react-router-dom';
import { TextLink } from '../../../components/TextLink';
import { useKeeping } from '../../../lib/useKeeping';
import { onPurpose } from '../../../lib/useLeaveGuard';
import { useSetupActions } from '../hooks/useSetupActions';
import { useSetupDraft } from '../hooks/useSetupDraft';
import { FieldsHint } from './MicrophoneFields';
import { SetupButtons } from './SetupButtons';
import { SetupSheet } from './SetupSheet';
import { UnkeptQuestion } from './UnkeptQuestion';

/** A setup that isn't kept yet; `from` and `begun` where it is a copy with changes. */
export function NewSetup({
  from,
  begun,
  settings,
}: {
  from: NamedSetup | null;
  begun?: SetupFields;
  settings: UserSettings;
}) {
  const draft = useSetupDraft(emptySetup, begun);
  const isChanged = JSON.stringify(draft.fields) !== JSON.stringify(begun ?? emptySetup);
  const { create } = useSetupActions();
  const { busy, failure, keep } = useKeeping();
  const navigate = useNavigate();
  const keepIt = () =>
    keep(async () => {
      const setup = await create({ ...draft.fields, copiedFromId: from?.id });
      await navigate(`/setups/${setup.id}`, { replace: true, state: onPurpose });
    });
  return (
    <SetupSheet
      {...{ draft, settings }}
      measured={null}
      caption={
        <>
          <TextLink to="/setups">Setups</TextLink>
          {from && (
            <>
              {' '}
              · a copy of “<TextLink to={`/setups/${from.id}`}>{from.name}</TextLink>”
            </>
          )}
        </>
      }
      says={
        from
          ? 'Change what you moved; the other one stays as it was.'
          : 'Write down what you measured with a tape.'
      }
      photo={<FieldsHint>A photo can be added once it is kept.</FieldsHint>}
      buttons={
        <SetupButtons {...{ busy, failure }} state="" onKeep={() => void keepIt()}>
          <UnkeptQuestion isChanged={isChanged} />
        </SetupButtons>
      }
    />
  );
}
