import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { LOCATION_PURPOSES } from '../../../../shared/domain/lifecycle/states';
import {
  createLocationRequest,
  type CreateLocationRequest,
  type Site,
} from '../../../../shared/schemas/places';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { RadioTiles } from '../../../components/ui/Tiles';
import { showToast } from '../../../components/ui/Toast';
import { useCreateLocation } from '../api/places';
import { PURPOSE_NAMES } from '../purposes';

export function LocationForm({ site, onMade }: { site: Site; onMade: () => void }): ReactNode {
  const { register, handleSubmit, formState } = useForm<CreateLocationRequest>({
    resolver: zodResolver(createLocationRequest),
    defaultValues: { siteId: site.id, name: '', purpose: 'rack' },
  });
  const create = useCreateLocation();
  const submit = handleSubmit((values) =>
    create.mutate(values, {
      onSuccess: (location) => {
        showToast(`${location.name} added to ${site.name}`);
        onMade();
      },
    }),
  );
  return (
    <form noValidate className="flex flex-col gap-4" onSubmit={(event) => void submit(event)}>
      <RadioTiles
        legend="What it is for"
        options={LOCATION_PURPOSES.map((value) => ({
          value,
          label: PURPOSE_NAMES[value].name,
          hint: PURPOSE_NAMES[value].hint,
        }))}
        error={formState.errors.purpose?.message}
        input={register('purpose')}
      />
      <TextField
        label="Name"
        hint="As it is written on the spot, such as “Rack C” or “Cage 2”."
        maxLength={LIMITS.shortText}
        error={formState.errors.name?.message}
        {...register('name')}
      />
      <ProblemNotice problem={create.error} />
      <Button type="submit" className="self-start" pending={create.isPending} pendingText="Adding">
        Add the location
      </Button>
    </form>
  );
}
