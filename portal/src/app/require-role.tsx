import { Outlet } from 'react-router-dom';
import type { Role } from '../api-client/session';
import { useMe } from '../api-client/session';
import { NotAllowed } from '../shared-ui/not-allowed';

interface RequireRoleProps {
  role: Exclude<Role, 'member'>;
  page: string;
  forWhom: string;
  /** Where the person's own version is. */
  instead: string;
}

/** Pages of a role; whoever lacks it is told who it is for. The API refuses by itself, this only says it kindly. */
export function RequireRole({ role, page, forWhom, instead }: RequireRoleProps) {
  const me = useMe();
  if (me.hasRole(role)) return <Outlet />;
  return (
    <NotAllowed page={page} forWhom={forWhom}>
      {instead} Ask an organiser if you need the role.
    </NotAllowed>
  );
}
