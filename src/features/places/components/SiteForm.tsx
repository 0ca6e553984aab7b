import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { CHOOSABLE_RULE_SETS, RULE_SETS } from '../../../../shared/domain/inspection/ruleSets';
import { createSiteRequest, type CreateSiteRequest } from '../../../../shared/schemas/places';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { SelectField, TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { ChoiceTiles } from '../../../components/ui/Tiles';
import { showToast } from '../../../components/ui/Toast';
import { findOwnTimeZone, listTimeZones } from '../../../lib/timeZones';
import { useFormDraft } from '../../../lib/useFormDraft';
import { useCreateSite } from '../api/places';

const ZONES = listTimeZones().map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }));

export function SiteForm({ onMade }: { onMade: () => void }): ReactNode {
  const form = useFormDraft<CreateSiteRequest>('site-new', {
    resolver: zodResolver(createSiteRequest),
    defaultValues: { name: '', timeZone: findOwnTimeZone(), ruleSets: [] },
  });
  const { errors } = form.formState;
  const create = useCreateSite();
  const submit = form.handleSubmit((values) =>
    create.mutate(values, {
      onSuccess: (site) => {
        form.clearDraft();
        showToast(`${site.name} added`);
        onMade();
      },
    }),
  );
  return (
    <form noValidate className="flex flex-col gap-4" onSubmit={(event) => void submit(event)}>
      <TextField
        label="Site name"
        maxLength={LIMITS.shortText}
        error={errors.name?.message}
        {...form.register('name')}
      />
      <SelectField
        label="Time zone"
        options={ZONES}
        error={errors.timeZone?.message}
        {...form.register('timeZone')}
      />
      <ChoiceTiles
        legend="Rule sets"
        hint="Slings here are judged by the strictest of them; the maker’s own limits always count too."
        options={CHOOSABLE_RULE_SETS.map((id) => ({
          value: id,
          label: RULE_SETS[id].name,
          hint: RULE_SETS[id].document,
        }))}
        error={errors.ruleSets?.message}
        input={form.register('ruleSets')}
      />
      <ProblemNotice problem={create.error} />
      <Button type="submit" className="self-start" pending={create.isPending} pendingText="Adding">
        Add the site
      </Button>
    </form>
  );
}
