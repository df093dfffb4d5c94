import { PageLoading } from '../components/PageLoading';
import { PageTitle } from '../components/PageTitle';
import { AdminSheet } from '../features/admin/components/AdminSheet';
import { useMe } from '../features/auth/hooks/useMe';
import { NotFoundPage } from './NotFoundPage';

/** For whoever runs the installation; to everybody else there is no such page. */
export function AdminPage() {
  const { me } = useMe();
  if (!me) return <PageLoading />;
  if (!me.roles.includes('admin') || me.readOnly) return <NotFoundPage />;
  return (
    <>
      <PageTitle>Admin</PageTitle>
      <AdminSheet />
    </>
  );
}
