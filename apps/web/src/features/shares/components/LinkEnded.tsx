import { ButtonLink } from '../../../components/ButtonLink';
import { PageMessage } from '../../../components/PageMessage';
import { ApiError } from '../../../lib/apiClient';

const endedCodes = ['link-ended', 'not-found', 'not-signed-in', 'bad-request'];

/** Whether a link opens nothing: ended, timed out, mistyped; the guest can't tell and needn't. */
export const isEnded = (error: Error) => error instanceof ApiError && endedCodes.includes(error.code);

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
