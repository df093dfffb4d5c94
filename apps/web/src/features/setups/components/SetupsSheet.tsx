import { Box, Flex, chakra } from '@chakra-ui/react';
import type { SetupListItem, UserSettings } from '@thudline/contracts';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { FieldError } from '../../../components/FieldError';
import { Headline } from '../../../components/Headline';
import { TextLink } from '../../../components/TextLink';
import { dateTime } from '../../../lib/format';
import { useSetups } from '../hooks/useSetups';
import { placesWords, takesOfSetup, takesWords } from '../setupWords';

/** Every setup of the player, the one used last first. */
export function SetupsSheet({ settings, canChange }: { settings: UserSettings; canChange: boolean }) {
  const { setups, error, retry } = useSetups();
  if (setups?.length === 0) return <NoSetups canChange={canChange} />;
  return (
    <>
      <Flex alignItems="center" gap="18px" minHeight="44px">
        <chakra.h1 fontSize="28px" lineHeight="34px" fontWeight={900} flex="1">
          Setups
        </chakra.h1>
        {canChange && <ButtonLink to="/setups/new">Write down a setup</ButtonLink>}
      </Flex>
      <chakra.p color="ink.muted" marginTop="4px">
        Where the microphones stood and how the preamps were set.
      </chakra.p>
      {error && (
        <Box marginTop="18px">
          <FieldError>
            The setups could not be read. {error.message}
            <Box marginTop="10px">
              <Button look="outline" onClick={retry}>
                Try again
              </Button>
            </Box>
          </FieldError>
        </Box>
      )}
      {!setups && !error && <Box minHeight="320px" role="status" aria-label="Loading the setups" />}
      {setups && <SetupsTable {...{ setups, settings }} />}
    </>
  );
}

function SetupsTable({ setups, settings }: { setups: SetupListItem[]; settings: UserSettings }) {
  return (
    <chakra.ul
      aria-label="Setups"
      listStyleType="none"
      marginTop="14px"
      borderTop="2px solid"
      borderBottom="2px solid"
      borderColor="ink"
    >
      {setups.map((setup) => (
        <SetupRow key={setup.id} {...{ setup, settings }} />
      ))}
    </chakra.ul>
  );
}

function SetupRow({ setup, settings }: { setup: SetupListItem; settings: UserSettings }) {
  const { id, name, takeCount, lastUsedAt } = setup;
  return (
    <chakra.li
      position="relative"
      display="grid"
      gridTemplateColumns={{ base: '1fr auto', lg: '320px 1fr 200px' }}
      columnGap="18px"
      alignItems="baseline"
      paddingY="11px"
      borderBottom="1px solid"
      borderColor="rule"
      _last={{ borderBottom: 'none' }}
      _hover={{ bg: 'target' }}
    >
      <chakra.span fontWeight={600} overflowWrap="anywhere">
        <Link to={`/setups/${id}`} style={{ textDecoration: 'none' }}>
          {name}
          <Box as="span" position="absolute" inset="0" />
        </Link>
      </chakra.span>
      <chakra.span
        color="ink.muted"
        fontSize="16px"
        gridRow={{ base: 2, lg: 'auto' }}
        gridColumn={{ base: '1 / -1', lg: 'auto' }}
      >
        {placesWords(setup, settings)}
      </chakra.span>
      <chakra.span textAlign="right" fontSize="small" color="ink.muted">
        {takeCount > 0 ? (
          <TextLink to={takesOfSetup(id)} position="relative" zIndex={1} paddingY="10px">
            {takesWords(takeCount)}
          </TextLink>
        ) : (
          takesWords(0)
        )}
        <chakra.span display={{ base: 'none', lg: 'inline' }}>
          {lastUsedAt && ` · ${dateTime(lastUsedAt)}`}
        </chakra.span>
      </chakra.span>
    </chakra.li>
  );
}

function NoSetups({ canChange }: { canChange: boolean }) {
  return (
    <>
      <Headline marginTop={{ base: '8px', lg: '17px' }} maxWidth="704px">
        <b>Write down where the microphones stand.</b> Next month you’ll want to put them back there.
      </Headline>
      <chakra.p marginTop="14px" maxWidth="600px">
        A tape measure and two minutes: how far the kick microphone is inside, how high the overhead hangs,
        where the preamps are turned to. Every field may stay empty.
      </chakra.p>
      {canChange && (
        <Flex marginTop="24px">
          <ButtonLink to="/setups/new">Write down a setup</ButtonLink>
        </Flex>
      )}
    </>
  );
}
