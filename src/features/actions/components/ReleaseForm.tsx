import { zodResolver } from '@hookform/resolvers/zod';
import { useMemo, type ReactNode } from 'react';
import { Controller } from 'react-hook-form';
import { z } from 'zod';
import { REASON_FACTS } from '../../../../shared/domain/lifecycle/reasons';
import { fileIdSchema, text } from '../../../../shared/schemas/common';
import { LIMITS } from '../../../../shared/limits';
import type { OpenReasonView } from '../../../../shared/schemas/slings';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { FilePicker } from '../../../components/ui/FilePicker';
import { TextArea } from '../../../components/ui/inputs';
import { Panel } from '../../../components/ui/Panel';
import { formatDateTime } from '../../../lib/format';
import { useFormDraft } from '../../../lib/useFormDraft';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';

const releaseValues = z.object({
  /** By the reason's id, so that a draft finds its reason again when another one was added. */
  clear: z.record(z.string(), z.object({ note: text(LIMITS.note), evidenceFileId: fileIdSchema.nullable() })),
});
type ReleaseValues = z.infer<typeof releaseValues>;

/** What each open reason asks for: a note always, evidence where its rule says so. */
function buildSchema(reasons: readonly OpenReasonView[]) {
  return releaseValues.superRefine(({ clear }, context) => {
    const fail = (id: number, field: string, message: string): void =>
      context.addIssue({ code: 'custom', path: ['clear', String(id), field], message });
    for (const { id, clearing } of reasons) {
      if (!clear[id]?.note) fail(id, 'note', 'Say why it is cleared.');
      if (clearing.needsEvidence && !clear[id]?.evidenceFileId) {
        fail(id, 'evidenceFileId', 'This reason is cleared with evidence: add it.');
      }
    }
  });
}

export function ReleaseForm({ sling, onDone, onReload }: ActFormProps): ReactNode {
  const act = useAct(sling, 'release');
  const reasons = sling.openReasons;
  const schema = useMemo(() => buildSchema(reasons), [reasons]);
  const form = useFormDraft<ReleaseValues>(`act.release.${sling.id}`, {
    defaultValues: { clear: {} },
    resolver: zodResolver(schema),
  });
  const submit = form.handleSubmit(({ clear }) =>
    act.mutate(
      {
        clear: reasons.map(({ id }) => {
          const given = clear[id];
          return {
            reasonId: id,
            note: given?.note ?? '',
            ...(given?.evidenceFileId ? { evidenceFileId: given.evidenceFileId } : {}),
          };
        }),
      },
      {
        onSuccess: (answer) => {
          form.clearDraft();
          onDone(answer);
        },
      },
    ),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-5">
      {reasons.map((reason) => (
        <ReasonToClear key={reason.id} reason={reason} form={form} />
      ))}
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
      <ActionBar>
        <Button type="submit" pending={act.isPending} pendingText={ACTION_WORDS.release.pending}>
          {ACTION_WORDS.release.button}
        </Button>
      </ActionBar>
    </form>
  );
}

function ReasonToClear({
  reason,
  form,
}: {
  reason: OpenReasonView;
  form: ReturnType<typeof useFormDraft<ReleaseValues>>;
}): ReactNode {
  const errors = form.formState.errors.clear?.[String(reason.id)];
  return (
    <Panel
      card
      title={REASON_FACTS[reason.code].name}
      aside={`${reason.placedBy?.name ?? 'Placed by the store’s own rules'}, ${formatDateTime(reason.placedAt)}`}
    >
      <div className="flex flex-col gap-4">
        {reason.note && (
          <p className="border-l-4 border-rule pl-3 break-words whitespace-pre-line">{reason.note}</p>
        )}
        <p>
          <b className="font-semibold">What clears it:</b> {reason.clearing.how}
        </p>
        <TextArea
          label="Why it is cleared"
          error={errors?.note?.message}
          {...form.register(`clear.${reason.id}.note`, { value: '' })}
        />
        <Controller
          control={form.control}
          name={`clear.${reason.id}.evidenceFileId`}
          defaultValue={null}
          render={({ field }) => (
            <FilePicker
              label={reason.clearing.needsEvidence ? 'Evidence' : 'Evidence (may stay empty)'}
              hint="A PDF, or a photo of the paper or the new tag."
              value={field.value}
              onChange={field.onChange}
              error={errors?.evidenceFileId?.message}
            />
          )}
        />
      </div>
    </Panel>
  );
}
