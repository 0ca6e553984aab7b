import { useRef, useState, type ReactNode } from 'react';
import type { Sling } from '../../../../shared/schemas/slings';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { PhotoPicker } from '../../../components/ui/PhotoPicker';
import { fileUrl } from '../../../config/paths';
import { formatCount } from '../../../lib/format';
import { useAddPhotos } from '../api/addPhotos';

/** Photos of what was just held go onto the record as they are taken. */
export function PhotosAfter({
  slingId,
  onAdded,
}: {
  slingId: number;
  onAdded: (sling: Sling) => void;
}): ReactNode {
  const add = useAddPhotos(slingId);
  const [unsaved, setUnsaved] = useState<string[]>([]);
  const [saved, setSaved] = useState<readonly string[]>([]);
  // Several uploads end in any order, each with all ids so far: what is on its way or saved isn't sent again
  const sent = useRef(new Set<string>());

  function save(ids: string[]): void {
    const fresh = ids.filter((id) => !sent.current.has(id));
    setUnsaved((all) => all.concat(fresh.filter((id) => !all.includes(id))));
    if (fresh.length === 0) return;
    for (const id of fresh) sent.current.add(id);
    add
      .mutateAsync(fresh)
      .then((sling) => {
        setSaved((all) => [...all, ...fresh]);
        setUnsaved((all) => all.filter((id) => !fresh.includes(id)));
        onAdded(sling);
      })
      // The failure itself is shown from the mutation; here it only becomes possible to try again
      .catch(() => fresh.forEach((id) => sent.current.delete(id)));
  }

  return (
    <div className="flex flex-col gap-3">
      {saved.length > 0 && (
        <div role="status">
          <p className="mb-2 font-semibold">{formatCount(saved.length, 'photo')} added to the record</p>
          <ul className="flex flex-wrap gap-2.5">
            {saved.map((id, i) => (
              <li key={id}>
                <img
                  src={fileUrl(id)}
                  alt={`Photo ${i + 1} on the record`}
                  className="size-24 rounded border border-rule object-cover"
                />
              </li>
            ))}
          </ul>
        </div>
      )}
      <PhotoPicker
        label={saved.length > 0 ? 'Another photo' : 'Add a photo of the damage'}
        hint="It helps whoever decides. You can leave it out."
        value={unsaved}
        onChange={save}
      />
      <ProblemNotice
        problem={add.error}
        action={
          <Button tone="quiet" pending={add.isPending} onClick={() => save(unsaved)}>
            Try again
          </Button>
        }
      />
    </div>
  );
}
