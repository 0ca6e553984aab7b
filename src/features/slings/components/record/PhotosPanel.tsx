import { useState, type ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import { LIMITS } from '../../../../../shared/limits';
import type { Sling } from '../../../../../shared/schemas/slings';
import { Button } from '../../../../components/ui/Button';
import { ProblemNotice } from '../../../../components/ui/Notice';
import { Panel } from '../../../../components/ui/Panel';
import { PhotoPicker } from '../../../../components/ui/PhotoPicker';
import { showToast } from '../../../../components/ui/Toast';
import { fileUrl } from '../../../../config/paths';
import { formatCount, formatDateTime } from '../../../../lib/format';
import { useUser } from '../../../../lib/session';
import { useUpdateSling } from '../../api/updateSling';

/** All photos of the sling, from whatever act; they are added, never taken away. */
export function PhotosPanel({ sling, timeZone }: { sling: Sling; timeZone: string | undefined }): ReactNode {
  const user = useUser();
  return (
    <Panel title="Photos">
      {sling.photos.length === 0 && <p className="text-muted">None yet.</p>}
      <ul className="grid grid-cols-3 gap-2.5 sm:grid-cols-4 lg:grid-cols-3">
        {sling.photos.map((photo, i) => (
          <li key={`${photo.fileId}.${photo.addedAt}`}>
            <a href={fileUrl(photo.fileId)} target="_blank" rel="noreferrer" className="block">
              <img
                src={`${fileUrl(photo.fileId)}?w=320`}
                alt={`Photo ${i + 1}, ${formatDateTime(photo.addedAt, timeZone)}`}
                loading="lazy"
                className="aspect-square w-full rounded border border-rule bg-wash object-cover"
              />
            </a>
          </li>
        ))}
      </ul>
      {mayCall('PATCH /api/slings/:id', user.roles) && <AddPhotos sling={sling} />}
    </Panel>
  );
}

function AddPhotos({ sling }: { sling: Sling }): ReactNode {
  const [ids, setIds] = useState<string[]>([]);
  const [isBusy, setIsBusy] = useState(false);
  const update = useUpdateSling(sling);
  const save = (): void =>
    update.mutate(
      { photoIds: ids },
      {
        onSuccess: () => {
          showToast(`${formatCount(ids.length, 'photo')} added.`);
          setIds([]);
        },
      },
    );
  return (
    <div className="no-print mt-3 flex flex-col gap-3">
      <PhotoPicker
        label="Add photos"
        value={ids}
        onChange={setIds}
        onBusyChange={setIsBusy}
        max={LIMITS.photosPerAct}
      />
      <ProblemNotice problem={update.error} />
      {ids.length > 0 && (
        <Button
          onClick={save}
          disabled={isBusy}
          pending={update.isPending}
          pendingText="Saving"
          className="self-start"
        >
          Put {formatCount(ids.length, 'photo')} on the record
        </Button>
      )}
    </div>
  );
}
