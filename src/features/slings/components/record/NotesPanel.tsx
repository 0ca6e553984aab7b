import { useState, type ReactNode } from 'react';
import { z } from 'zod';
import { mayCall } from '../../../../../shared/domain/access/routes';
import { LIMITS } from '../../../../../shared/limits';
import type { Sling } from '../../../../../shared/schemas/slings';
import { Button } from '../../../../components/ui/Button';
import { SelectField, TextArea } from '../../../../components/ui/inputs';
import { ProblemNotice } from '../../../../components/ui/Notice';
import { Panel } from '../../../../components/ui/Panel';
import { showToast } from '../../../../components/ui/Toast';
import { useDraft } from '../../../../lib/draft';
import { useUser } from '../../../../lib/session';
import { useLocations } from '../../../../lib/places';
import { useUpdateSling } from '../../api/updateSling';
import { usePlaceNames } from '../../hooks/usePlaceNames';

/** Notes and home location: what anybody in the store may change without a correction. */
export function NotesPanel({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const places = usePlaceNames();
  const [isEditing, setIsEditing] = useState(false);
  return (
    <Panel title="Notes and home">
      {isEditing ? (
        <NotesForm sling={sling} onDone={() => setIsEditing(false)} />
      ) : (
        <>
          <p>
            <span className="text-muted">Home location: </span>
            {places.location(sling.homeLocationId) ?? 'none yet'}
          </p>
          <p className="py-2 break-words whitespace-pre-wrap">
            {sling.notes || <span className="text-muted">No notes.</span>}
          </p>
          {mayCall('PATCH /api/slings/:id', user.roles) && (
            <Button tone="quiet" className="no-print" onClick={() => setIsEditing(true)}>
              Change notes or home
            </Button>
          )}
        </>
      )}
    </Panel>
  );
}

const draftSchema = z.object({ notes: z.string(), homeLocationId: z.string() });

function NotesForm({ sling, onDone }: { sling: Sling; onDone: () => void }): ReactNode {
  const { values, setValues, clear } = useDraft(`slings.notes.${sling.id}`, draftSchema, {
    notes: sling.notes,
    homeLocationId: String(sling.homeLocationId ?? ''),
  });
  const locations = useLocations().data?.items ?? [];
  const homes = locations.filter(({ siteId, purpose }) => siteId === sling.siteId && purpose !== 'cage');
  const update = useUpdateSling(sling);
  const save = (): void =>
    update.mutate(
      { notes: values.notes, homeLocationId: values.homeLocationId ? Number(values.homeLocationId) : null },
      {
        onSuccess: () => {
          clear();
          showToast('Saved.');
          onDone();
        },
      },
    );
  return (
    <form
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        save();
      }}
    >
      <SelectField
        label="Home location"
        placeholder="None"
        options={homes.map(({ id, name }) => ({ value: id, label: name }))}
        value={values.homeLocationId}
        onChange={(event) => setValues({ ...values, homeLocationId: event.target.value })}
      />
      <TextArea
        label="Notes"
        rows={4}
        maxLength={LIMITS.note}
        value={values.notes}
        onChange={(event) => setValues({ ...values, notes: event.target.value })}
      />
      <ProblemNotice problem={update.error} />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" pending={update.isPending} pendingText="Saving">
          Save
        </Button>
        <Button
          tone="quiet"
          onClick={() => {
            clear();
            onDone();
          }}
        >
          Leave as it was
        </Button>
      </div>
    </form>
  );
}
