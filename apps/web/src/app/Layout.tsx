import { Box, Flex, chakra } from '@chakra-ui/react';
import { Suspense } from 'react';
import { Link, Outlet, useLocation } from 'react-router-dom';
import { HeaderLine } from '../components/HeaderLine';
import { PageLoading } from '../components/PageLoading';
import { Swell } from '../components/Swell';
import { Wordmark } from '../components/Wordmark';
import { AccountCorner } from '../features/auth/components/AccountCorner';
import { useMe } from '../features/auth/hooks/useMe';

function NavLink({ to, children }: { to: string; children: string }) {
  const here = useLocation().pathname.startsWith(to);
  return (
    <chakra.span position="relative" fontWeight={600}>
      <Link to={to} aria-current={here ? 'page' : undefined} style={{ textDecoration: 'none' }}>
        {children}
      </Link>
      {here && <Swell depthPx={5} linePx={1.5} />}
    </chakra.span>
  );
}

/** Wordmark, places, who is signed in; below the line the page. */
export function Layout() {
  const { me } = useMe();
  return (
    <Box
      maxWidth="1280px"
      marginX="auto"
      paddingX={{ base: 0, lg: '64px' }}
      paddingBottom={{ base: 0, lg: '48px' }}
    >
      <SkipLink />
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
        <Flex as="nav" aria-label="Places" gap="26px" lineHeight="26px" marginBottom={{ lg: '2px' }}>
          {me && <NavLink to="/takes">Takes</NavLink>}
        </Flex>
        <Box marginLeft="auto" lineHeight="26px">
          <AccountCorner />
        </Box>
      </Flex>
      <HeaderLine />
      <main id="page" tabIndex={-1} style={{ outline: 'none' }}>
        <Suspense fallback={<PageLoading />}>
          <Outlet />
        </Suspense>
      </main>
    </Box>
  );
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
