import { ButtonLink } from '../components/ButtonLink';
import { PageMessage } from '../components/PageMessage';

export function NotFoundPage() {
  return (
    <PageMessage
      strong="There is nothing at this address."
      rest="The link may be old, or a letter is missing."
    >
      <ButtonLink to="/takes">Go to your takes</ButtonLink>
    </PageMessage>
  );
}
