import type { ReactNode } from 'react';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { BOARD_SECTIONS } from '../../features/slings/board/sections';
import { BoardColumn } from '../../features/slings/components/board/BoardColumn';
import { SiteSegments } from '../../features/slings/components/SiteSegments';
import { useSiteChoice } from '../../features/slings/hooks/useSiteChoice';

export function Component(): ReactNode {
  const { sites, siteId } = useSiteChoice();
  const only = sites.length === 1 ? sites[0] : undefined;
  return (
    <>
      <PageHeader
        title="Quarantine"
        sub={`${only ? `${only.name}. ` : ''}What is removed from service, where it is and who acts next. Longest waiting first.`}
      />
      <SiteSegments sites={sites} siteId={siteId} path={paths.cage} />
      <div className="grid gap-y-8 border-t-2 border-ink pt-3 xl:grid-cols-5">
        {BOARD_SECTIONS.map((section) => (
          <BoardColumn key={section.id} section={section} siteId={siteId} />
        ))}
      </div>
    </>
  );
}
