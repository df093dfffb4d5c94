import { ButtonLink } from '../../../components/ButtonLink';
import { PageMessage } from '../../../components/PageMessage';

/** One page for every link that opens nothing, with the next step. */
export function LinkEnded() {
  return (
    <PageMessage
      strong="This link opens nothing any more."
      rest="It has ended, or a part of it was lost on the way. Ask whoever sent it for a new one."
    >
      <ButtonLink to="/">See what Thudline does</ButtonLink>
    </PageMessage>
  );
}
