import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { TextButton } from '../components/Button';
import { PageTitle } from '../components/PageTitle';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { ForgotForm } from '../features/auth/components/ForgotForm';

const margin = [
  {
    title: 'Why a link?',
    text: 'Passwords are kept in a form that can’t be read back, not even by us. You set a new one.',
  },
];

/** A password that was forgotten: a link to set a new one comes by mail. */
export function ForgotPage() {
  const [sentTo, setSentTo] = useState('');
  if (sentTo) return <Sent email={sentTo} onAgain={() => setSentTo('')} />;
  return (
    <AuthSheet strong="Forgot the password?" rest="A link to set a new one comes by mail." margin={margin}>
      <PageTitle>Set a new password</PageTitle>
      <ForgotForm onSent={setSentTo} />
    </AuthSheet>
  );
}

/** The same words whether there is an account or not: a stranger learns nothing. */
function Sent({ email, onAgain }: { email: string; onAgain: () => void }) {
  const nothingCame = [
    {
      title: 'Nothing came?',
      text: (
        <>
          Look where unwanted mail goes, then <TextButton onClick={onAgain}>send it again</TextButton>.
        </>
      ),
    },
  ];
  return (
    <AuthSheet strong="Look into your mail." rest="The link in it works once." margin={nothingCame}>
      <PageTitle>Look into your mail</PageTitle>
      <chakra.p role="status" overflowWrap="anywhere">
        If there is an account for <b>{email}</b>, a mail is on its way.
      </chakra.p>
    </AuthSheet>
  );
}
