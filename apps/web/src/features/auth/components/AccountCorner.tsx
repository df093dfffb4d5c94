import { Box, Flex, chakra } from '@chakra-ui/react';
import { useEffect, useRef, useState } from 'react';
import { Link, useNavigate, useLocation } from 'react-router-dom';
import { TextButton } from '../../../components/Button';
import { Swell } from '../../../components/Swell';
import { TextLink } from '../../../components/TextLink';
import { chooseColorMode, colorModes, storedColorMode, type ColorMode } from '../../../theme/colorMode';
import { useAuthActions } from '../hooks/useAuthActions';
import { useMe } from '../hooks/useMe';

const modeWords: Record<ColorMode, string> = { system: 'as the system', light: 'light', dark: 'dark' };

/** Top right: the way in for a guest, the name with its small list for someone signed in. */
export function AccountCorner() {
  const { me } = useMe();
  const { pathname } = useLocation();
  if (me === undefined) return null;
  if (me) return <AccountList name={me.name} readOnly={me.readOnly} isAdmin={me.roles.includes('admin')} />;
  if (pathname === '/sign-in')
    return (
      <>
        <chakra.span color="ink.muted">New here?</chakra.span>{' '}
        <TextLink to="/join" fontWeight={600} marginLeft="6px">
          Join
        </TextLink>
      </>
    );
  return (
    <Flex gap="26px">
      {pathname !== '/check-take' && (
        <chakra.span color="ink.muted" display={{ base: 'none', sm: 'inline' }}>
          <Link to="/check-take" style={{ textDecoration: 'none' }}>
            The check take
          </Link>
        </chakra.span>
      )}
      <TextLink to="/sign-in" fontWeight={600}>
        Sign in
      </TextLink>
    </Flex>
  );
}

function AccountList({ name, readOnly, isAdmin }: { name: string; readOnly: boolean; isAdmin: boolean }) {
  const here = ['/settings', '/admin'].includes(useLocation().pathname);
  const [open, setOpen] = useState(false);
  const box = useRef<HTMLDivElement>(null);
  useCloseOnLeave(open, box, () => setOpen(false));
  return (
    <Box position="relative" ref={box}>
      <chakra.button
        aria-expanded={open}
        color={here ? 'ink' : 'ink.muted'}
        fontWeight={here ? 600 : 400}
        cursor="pointer"
        minHeight="26px"
        maxWidth={{ base: '130px', lg: '260px' }}
        truncate
        onClick={() => setOpen(!open)}
      >
        {name}
      </chakra.button>
      {here && <Swell depthPx={5} linePx={1.5} />}
      {open && <OpenList canSet={!readOnly} isAdmin={isAdmin && !readOnly} onDone={() => setOpen(false)} />}
    </Box>
  );
}

function OpenList({ canSet, isAdmin, onDone }: { canSet: boolean; isAdmin: boolean; onDone: () => void }) {
  const { signOut } = useAuthActions();
  const navigate = useNavigate();
  const [mode, setMode] = useState(storedColorMode);
  const [failure, setFailure] = useState('');
  const leave = async () => {
    try {
      await signOut();
      onDone();
      await navigate('/sign-in');
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Signing out did not work. Try again.');
    }
  };
  return (
    <Box
      position="absolute"
      right="0"
      top="100%"
      marginTop="8px"
      zIndex={5}
      width="250px"
      bg="sheet"
      border="2px solid"
      borderColor="ink"
      padding="14px 18px 16px"
      fontSize="small"
    >
      <chakra.fieldset>
        <chakra.legend color="ink.muted" fontSize="caption">
          Paper
        </chakra.legend>
        <Flex gap="14px" wrap="wrap" marginBottom="10px">
          {colorModes.map((each) => (
            <chakra.label
              key={each}
              display="inline-flex"
              gap="6px"
              minHeight="32px"
              alignItems="center"
              cursor="pointer"
            >
              <input
                type="radio"
                name="paper"
                checked={mode === each}
                onChange={() => {
                  chooseColorMode(each);
                  setMode(each);
                }}
              />
              {modeWords[each]}
            </chakra.label>
          ))}
        </Flex>
      </chakra.fieldset>
      {canSet && (
        <Box marginBottom="8px">
          <TextLink to="/links" fontWeight={600} onClick={onDone}>
            My links
          </TextLink>
        </Box>
      )}
      {canSet && (
        <Box marginBottom="8px">
          <TextLink to="/settings" fontWeight={600} onClick={onDone}>
            Settings
          </TextLink>
        </Box>
      )}
      {isAdmin && (
        <Box marginBottom="8px">
          <TextLink to="/admin" fontWeight={600} onClick={onDone}>
            Admin
          </TextLink>
        </Box>
      )}
      <TextButton fontWeight={600} onClick={() => void leave()}>
        Sign out
      </TextButton>
      {failure && (
        <Box role="alert" color="fix" marginTop="8px">
          {failure}
        </Box>
      )}
    </Box>
  );
}

function useCloseOnLeave(open: boolean, box: React.RefObject<HTMLDivElement | null>, close: () => void) {
  useEffect(() => {
    if (!open) return;
    const onPointer = (event: PointerEvent) => {
      if (!box.current?.contains(event.target as Node)) close();
    };
    const onKey = (event: KeyboardEvent) => {
      if (event.key === 'Escape') close();
    };
    document.addEventListener('pointerdown', onPointer);
    document.addEventListener('keydown', onKey);
    return () => {
      document.removeEventListener('pointerdown', onPointer);
      document.removeEventListener('keydown', onKey);
    };
  });
}
