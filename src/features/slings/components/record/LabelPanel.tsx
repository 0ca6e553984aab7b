import type { ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import type { Sling } from '../../../../../shared/schemas/slings';
import { LinkButton } from '../../../../components/ui/Button';
import { Panel } from '../../../../components/ui/Panel';
import { TagCode } from '../../../../components/ui/TagCode';
import { paths } from '../../../../config/paths';
import { useUser } from '../../../../lib/session';

const MEANINGS = {
  none: 'It has no label of ours yet. Print one, fix it to the sling, then confirm it by a scan.',
  printed:
    'Printed, but not confirmed on the sling. Fix it, scan it there and type the last four characters.',
  live: 'Fixed to the sling and confirmed.',
  void: 'This label is void. Print a new one and take the old one off.',
} as const;

/** Our label: what it is now, and its next step. */
export function LabelPanel({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const status = sling.tag?.status ?? 'none';
  const isGone = sling.state === 'destroyed' || sling.state === 'departed';
  return (
    <Panel title="Label">
      {sling.tag && (
        <p className="pb-1">
          <TagCode code={sling.tag.code} className="text-lg" />
        </p>
      )}
      <p className="text-muted">{isGone && status === 'none' ? 'Its labels are void.' : MEANINGS[status]}</p>
      {mayCall('POST /api/label-runs', user.roles) && !isGone && (
        <div className="no-print mt-3 flex flex-wrap gap-3">
          {status === 'printed' && <LinkButton to={paths.scan()}>Scan to confirm it</LinkButton>}
          <LinkButton
            to={paths.labelsFor([sling.id])}
            tone={status === 'none' || status === 'void' ? 'primary' : 'quiet'}
          >
            {status === 'none' || status === 'void' ? 'Print its label' : 'Print it again'}
          </LinkButton>
        </div>
      )}
    </Panel>
  );
}
