import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ROLE_NAMES } from '../../../../shared/domain/access/roles';
import type { User } from '../../../../shared/schemas/people';
import type { Site } from '../../../../shared/schemas/places';
import { DataTable, type Column } from '../../../components/ui/DataTable';
import { formatDate, getToday } from '../../../lib/format';

/** Everybody with an account: who, as what, where, until when. */
export function UserList({
  users,
  sites,
  addressOf,
}: {
  users: readonly User[];
  sites: readonly Site[];
  addressOf: (id: number) => string;
}): ReactNode {
  const today = getToday();
  const columns: Column<User>[] = [
    {
      id: 'name',
      header: 'Name',
      cell: (user) => (
        <Link
          to={addressOf(user.id)}
          className="-my-2.5 flex min-h-14 flex-col justify-center text-petrol hover:underline"
        >
          <span className="underline underline-offset-4">{user.name}</span>
          <span className="text-[0.9375rem] font-normal break-all text-muted">{user.email}</span>
          {!isPlainlyActive(user) && (
            <span className="text-[0.9375rem] font-medium text-ink md:hidden">
              {describeAccount(user, today)}
            </span>
          )}
        </Link>
      ),
    },
    { id: 'roles', header: 'Roles', cell: (user) => user.roles.map((role) => ROLE_NAMES[role]).join(', ') },
    { id: 'sites', header: 'Sites', isWideOnly: true, cell: (user) => nameSites(user, sites) },
    { id: 'status', header: 'Account', isWideOnly: true, cell: (user) => describeAccount(user, today) },
  ];
  return <DataTable caption="Users" columns={columns} rows={users} rowKey={(user) => user.id} />;
}

const isPlainlyActive = ({ endsOn, hasPassword }: User): boolean => hasPassword && endsOn === null;

function nameSites(user: User, sites: readonly Site[]): string {
  const names = sites.filter(({ id }) => user.siteIds.includes(id)).map(({ name }) => name);
  const others = user.siteIds.length - names.length;
  if (others > 0) names.push(`${others} more`);
  return names.join(', ') || 'None';
}

/** "Active", "Invited, no password yet", "Ended 3 Nov 2025", "Until 3 Nov 2027". */
export function describeAccount(
  { endsOn, hasPassword }: Pick<User, 'endsOn' | 'hasPassword'>,
  today: string,
): string {
  if (endsOn && endsOn < today) return `Ended ${formatDate(endsOn)}`;
  const until = endsOn ? `until ${formatDate(endsOn)}` : '';
  if (!hasPassword) return ['Invited, no password yet', until].filter(Boolean).join(', ');
  return until ? `Active ${until}` : 'Active';
}
