import { chakra } from '@chakra-ui/react';
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
      <Outlet />
    </PageFrame>
  );
}
