import { Box, Flex, chakra } from '@chakra-ui/react';
import { Suspense, useEffect, useRef, type ReactNode } from 'react';
import { Link, ScrollRestoration, useLocation } from 'react-router-dom';
import { HeaderLine } from './HeaderLine';
import { PageLoading } from './PageLoading';
import { Wordmark } from './Wordmark';

/** Wordmark, places, what stands in the corner; below the line the page. */
export function PageFrame({
  places,
  corner,
  children,
}: {
  places?: ReactNode;
  corner?: ReactNode;
  children: ReactNode;
}) {
  return (
    <Box
      maxWidth="1280px"
      marginX="auto"
      paddingX={{ base: 0, lg: '64px' }}
      paddingBottom={{ base: 0, lg: '48px' }}
      _print={{ padding: 0 }}
    >
      <SkipLink />
      <ScrollRestoration />
      <FocusOnPage />
      <Flex
        as="header"
        height={{ base: '55px', lg: '74px' }}
        alignItems="flex-end"
        paddingBottom={{ base: '11px', lg: '17px' }}
        paddingX={{ base: '18px', lg: 0 }}
        gap={{ base: '20px', lg: '30px' }}
        _print={{ display: 'none' }}
      >
        <Box asChild marginBottom={{ base: '-4px', lg: '-2px' }}>
          <Link to="/" aria-label="thudline, first page">
            <Wordmark />
          </Link>
        </Box>
        {places && (
          <Flex as="nav" aria-label="Places" gap="26px" lineHeight="26px" marginBottom={{ lg: '2px' }}>
            {places}
          </Flex>
        )}
        <Box marginLeft="auto" lineHeight="26px">
          {corner}
        </Box>
      </Flex>
      <HeaderLine />
      <main id="page" tabIndex={-1} style={{ outline: 'none' }}>
        <Suspense fallback={<PageLoading />}>{children}</Suspense>
      </main>
    </Box>
  );
}

/** Another page begins at its beginning for the keyboard and for a screen reader, too. */
function FocusOnPage() {
  const { pathname } = useLocation();
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    document.getElementById('page')?.focus({ preventScroll: true });
  }, [pathname]);
  return null;
}

function SkipLink() {
  return (
    <chakra.a
      href="#page"
      position="absolute"
      left="8px"
      top="-60px"
      zIndex={10}
      bg="ink"
      color="sheet"
      padding="10px 16px"
      _focus={{ top: '8px' }}
    >
      Skip to the page
    </chakra.a>
  );
}
