import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ROLE_NAMES } from '../../../shared/domain/access/roles';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { HomeBody } from '../../features/slings/components/home/HomeBody';
import { useUser } from '../../lib/session';
import { scanDrawing } from '../navigation';

export function Component(): ReactNode {
  const user = useUser();
  return (
    <>
      <PageHeader title={user.name} sub={user.roles.map((role) => ROLE_NAMES[role]).join(', ')} />
      <Link
        to={paths.scan()}
        className="mb-6 flex min-h-28 items-center gap-5 rounded-[14px] bg-petrol px-6 py-4 text-petrol-ink hover:brightness-110"
      >
        <span className="size-16 shrink-0">{scanDrawing}</span>
        <span>
          <span className="block text-[1.75rem] leading-tight font-bold">Scan a label</span>
          <span className="block">It says at once whether the sling may be used, and opens its record.</span>
        </span>
      </Link>
      <HomeBody />
    </>
  );
}
