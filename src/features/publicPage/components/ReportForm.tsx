import { useState, type FormEvent, type ReactNode } from 'react';
import { damageReportRequest } from '../../../../shared/schemas/publicPage';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { TextArea, TextField } from '../../../components/ui/inputs';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { PhotoPicker } from '../../../components/ui/PhotoPicker';
import { toProblem } from '../../../lib/problem';
import { useLiveDraft } from '../../../lib/useLiveDraft';
import { useReportDamage } from '../api/reportDamage';
import { EMPTY_REPORT, reportDraftSchema } from '../reportDraft';

/** Name, what was seen, a photo if there is a hand free for one. What was typed stays until it is sent. */
export function ReportForm({ code, onSent }: { code: string; onSent: (message: string) => void }): ReactNode {
  const { values, update, clear } = useLiveDraft(`report.${code}`, reportDraftSchema, EMPTY_REPORT);
  const report = useReportDamage(code);
  const [isPressed, setIsPressed] = useState(false);
  const [isSending, setIsSending] = useState(false);
  const parsed = damageReportRequest.safeParse({
    name: values.name,
    note: values.note,
    ...(values.photoIds.length > 0 ? { photoIds: values.photoIds } : {}),
  });
  const errorFor = (field: 'name' | 'note'): string | undefined =>
    isPressed ? parsed.error?.issues.find(({ path }) => path[0] === field)?.message : undefined;

  function send(event: FormEvent): void {
    event.preventDefault();
    setIsPressed(true);
    if (!parsed.success) return;
    report.mutate(parsed.data, {
      onSuccess: ({ message }) => {
        clear();
        onSent(message);
      },
    });
  }

  return (
    <form onSubmit={send} noValidate className="flex flex-col gap-5">
      <TextArea
        label="What did you see?"
        hint="A cut, a bent hook, a fall, heat: in your own words."
        rows={3}
        maxLength={LIMITS.note}
        value={values.note}
        onChange={({ target }) => update((now) => ({ ...now, note: target.value }))}
        error={errorFor('note')}
      />
      <PhotoPicker
        label="Photo"
        hint="It helps. You can leave it out."
        path={`/public/tags/${encodeURIComponent(code)}/files`}
        value={values.photoIds}
        onChange={(photoIds) => update((now) => ({ ...now, photoIds }))}
        onBusyChange={setIsSending}
        max={4}
      />
      <TextField
        label="Your name"
        autoComplete="name"
        maxLength={LIMITS.name}
        value={values.name}
        onChange={({ target }) => update((now) => ({ ...now, name: target.value }))}
        error={errorFor('name')}
      />
      <NotSent problem={report.error} />
      <Button
        type="submit"
        tone="danger"
        wide
        className="min-h-16 text-xl"
        pending={report.isPending || isSending}
        pendingText={isSending ? 'The photo is being sent' : 'Sending'}
      >
        Send the report
      </Button>
    </form>
  );
}

/** Nothing was sent: what to do with the sling meanwhile. */
function NotSent({ problem }: { problem: unknown }): ReactNode {
  if (!problem) return null;
  const { status, retryAfterSeconds } = toProblem(problem);
  if (status === 429) {
    const minutes = Math.max(1, Math.ceil((retryAfterSeconds ?? 60) / 60));
    return (
      <Notice tone="error" title="Too many reports from here in a short time">
        Nothing was sent; what you typed is kept. Try again in{' '}
        {minutes === 1 ? 'a minute' : `${minutes} minutes`}. Until then keep the sling aside and tell the
        store.
      </Notice>
    );
  }
  return (
    <div className="flex flex-col gap-2">
      <ProblemNotice problem={problem} />
      <p className="font-medium">
        What you typed is kept. Keep the sling aside and tell the store meanwhile.
      </p>
    </div>
  );
}
