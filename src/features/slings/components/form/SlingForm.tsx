import { useState, type ReactNode } from 'react';
import { FormProvider, type FieldPath } from 'react-hook-form';
import type { Sling } from '../../../../../shared/schemas/slings';
import { ActionBar } from '../../../../components/ui/ActionBar';
import { Button } from '../../../../components/ui/Button';
import { Notice, ProblemNotice } from '../../../../components/ui/Notice';
import { toProblem, type ApiProblem } from '../../../../lib/problem';
import { useUnits, useUser } from '../../../../lib/session';
import { useFormDraft } from '../../../../lib/useFormDraft';
import { useCreateSling } from '../../api/createSling';
import { toFormPath, type Fault } from '../../form/faults';
import { keepLastRegistration, makeStartingForm } from '../../form/lastRegistration';
import { checkForm, slingFormResolver } from '../../form/resolver';
import type { SlingFormValues } from '../../form/values';
import { BuildSection } from './BuildSection';
import { CertificateSection } from './CertificateSection';
import { FaultSummary } from './FaultSummary';
import { FittingsSection } from './FittingsSection';
import { IdentitySection } from './IdentitySection';
import { KindSection } from './KindSection';
import { locateFaults, type LocatedFault } from './locateFault';
import { LoadsSection } from './LoadsSection';
import { MoreSection } from './MoreSection';
import { PlaceSection } from './PlaceSection';

const NOTHING_OMITTED: readonly string[] = [];

export interface SlingFormProps {
  today: string;
  /** The site, where the person works at one only. */
  onlySiteId: number | undefined;
  onRegistered: (sling: Sling) => void;
}

/** One form for all six kinds; what is typed survives a reload until it is saved. */
export function SlingForm({ today, onlySiteId, onRegistered }: SlingFormProps): ReactNode {
  const user = useUser();
  const units = useUnits();
  const start = (): SlingFormValues => makeStartingForm(user.id, units, today, onlySiteId);
  const { clearDraft, wasRestored, ...form } = useFormDraft<SlingFormValues>(
    `slings.new.1.${user.id}`,
    { defaultValues: start(), resolver: slingFormResolver },
    NOTHING_OMITTED,
  );
  const create = useCreateSling();
  const [faults, setFaults] = useState<readonly LocatedFault[]>([]);
  const [isBusy, setIsBusy] = useState(false);
  const [isDraftNoted, setIsDraftNoted] = useState(wasRestored);

  const goTo = (path: string): void => form.setFocus(path as FieldPath<SlingFormValues>);

  function showRefusal(problem: ApiProblem, kind: string): void {
    const refused = listRefused(problem, kind);
    for (const { path, message } of refused) {
      form.setError(path as FieldPath<SlingFormValues>, { type: 'server', message });
    }
    if (refused[0]) goTo(refused[0].path);
  }

  async function submit(values: SlingFormValues): Promise<void> {
    setFaults([]);
    const { request } = checkForm(values);
    if (!request) return;
    try {
      const sling = await create.mutateAsync(request);
      keepLastRegistration(user.id, values);
      clearDraft();
      onRegistered(sling);
    } catch (thrown) {
      showRefusal(toProblem(thrown), values.kind);
    }
  }

  function startAfresh(): void {
    form.reset(start());
    clearDraft();
    setFaults([]);
    setIsDraftNoted(false);
    create.reset();
  }

  return (
    <FormProvider {...form}>
      <form
        noValidate
        onSubmit={(event) =>
          void form.handleSubmit(submit, () =>
            setFaults(locateFaults(checkForm(form.getValues()).faults ?? [])),
          )(event)
        }
      >
        {isDraftNoted && (
          <Notice
            tone="good"
            className="mb-4"
            title="Your draft is still here"
            action={
              <Button tone="quiet" onClick={startAfresh}>
                Start afresh
              </Button>
            }
          >
            Nothing of it is on the books yet.
          </Notice>
        )}
        <KindSection />
        <IdentitySection today={today} />
        <BuildSection />
        <LoadsSection />
        <FittingsSection />
        <CertificateSection today={today} />
        <PlaceSection today={today} />
        <MoreSection today={today} onPhotosBusy={setIsBusy} />
        <div className="flex flex-col gap-3">
          <FaultSummary faults={faults} onGoTo={goTo} />
          <ProblemNotice problem={create.error} />
        </div>
        <ActionBar>
          <Button type="submit" pending={create.isPending} pendingText="Registering" disabled={isBusy}>
            {isBusy ? 'Photos are being sent' : 'Register the sling'}
          </Button>
        </ActionBar>
      </form>
    </FormProvider>
  );
}

/** The server's faults at their fields; a duplicate without a field belongs to the serial. */
function listRefused(problem: ApiProblem, kind: string): Fault[] {
  if (problem.errors.length > 0) {
    return problem.errors.map(({ path, message }) => ({ path: toFormPath(path, kind), message }));
  }
  return problem.type.endsWith('duplicate') ? [{ path: 'makerSerial', message: problem.detail }] : [];
}
