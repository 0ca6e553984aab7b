import type { ReactNode } from 'react';
import { mayCall } from '../../../shared/domain/access/routes';
import { LinkButton } from '../../components/ui/Button';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { FilterPanel } from '../../features/slings/components/register/FilterPanel';
import { SlingList } from '../../features/slings/components/register/SlingList';
import { useRegisterFilters } from '../../features/slings/hooks/useRegisterFilters';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  const user = useUser();
  const register = useRegisterFilters();
  return (
    <>
      <PageHeader
        title="Slings"
        actions={
          mayCall('POST /api/slings', user.roles) && (
            <LinkButton to={paths.newSling}>Register a sling</LinkButton>
          )
        }
      />
      <FilterPanel register={register} />
      <SlingList register={register} />
    </>
  );
}
