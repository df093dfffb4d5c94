import { chakra } from '@chakra-ui/react';
import { lazy, Suspense } from 'react';
import { Link, Outlet, useLocation } from 'react-router-dom';
import { PageFrame } from '../components/PageFrame';
import { Swell } from '../components/Swell';
import { AccountCorner } from '../features/auth/components/AccountCorner';
import { useMe } from '../features/auth/hooks/useMe';

function NavLink({ to, also, children }: { to: string; also?: string; children: string }) {
  const { pathname } = useLocation();
  const here = pathname.startsWith(to) || (also !== undefined && pathname.startsWith(also));
  return (
    <chakra.span position="relative" fontWeight={600}>
      <Link to={to} aria-current={here ? 'page' : undefined} style={{ textDecoration: 'none' }}>
        {children}
      </Link>
      {here && <Swell depthPx={5} linePx={1.5} />}
    </chakra.span>
  );
}

const GoesOn = lazy(async () => ({
  default: (await import('../features/settings/components/GoesOn')).GoesOn,
}));

/** On every page until it is stopped; the settings say it in their own place. */
function AccountGoes({ deleteAfter }: { deleteAfter: string }) {
  const here = useLocation().pathname === '/settings';
  if (here) return null;
  return (
    <chakra.aside
      aria-label="Your account"
      bg="sheet"
      paddingX={{ base: '18px', md: '40px', lg: '64px' }}
      paddingTop="20px"
      _print={{ display: 'none' }}
    >
      <Suspense fallback={null}>
        <GoesOn deleteAfter={deleteAfter} />
      </Suspense>
    </chakra.aside>
  );
}

/** The frame of every page but the shared sheet's and Big print's. */
export function Layout() {
  const { me } = useMe();
  return (
    <PageFrame
      places={
        me && (
          <>
            <NavLink to="/takes" also="/setups">
              Takes
            </NavLink>
            <NavLink to="/rooms">Rooms</NavLink>
          </>
        )
      }
      corner={<AccountCorner />}
    >
      {me?.deleteAfter && <AccountGoes deleteAfter={me.deleteAfter} />}
      <Outlet />
    </PageFrame>
  );
}
