import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { LENGTH_UNITS, LOAD_UNITS } from '../../../../shared/domain/units/units';
import { updateAccountRequest, type SessionUser } from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { SelectField, TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { showToast } from '../../../components/ui/Toast';
import { useUpdateAccount } from '../api/account';

const accountForm = updateAccountRequest.required();
type AccountValues = z.infer<typeof accountForm>;

const LOAD_NAMES: Record<(typeof LOAD_UNITS)[number], string> = {
  kg: 'Kilograms (kg)',
  t: 'Tonnes (t)',
  lb: 'Pounds (lb)',
  short_ton: 'Short tons',
};
const LENGTH_NAMES: Record<(typeof LENGTH_UNITS)[number], string> = {
  m: 'Metres (m)',
  mm: 'Millimetres (mm)',
  ft: 'Feet (ft)',
  in: 'Inches (in)',
};

/** Name, and the units that this person reads loads and lengths in. */
export function AccountForm({
  user,
  onSaved,
}: {
  user: SessionUser;
  onSaved: () => Promise<void>;
}): ReactNode {
  const { name, loadUnit, lengthUnit } = user;
  const { register, handleSubmit, formState, reset } = useForm<AccountValues>({
    resolver: zodResolver(accountForm),
    defaultValues: { name, loadUnit, lengthUnit },
  });
  const update = useUpdateAccount();
  const { errors, isDirty } = formState;
  const submit = handleSubmit((values) =>
    update.mutate(values, {
      onSuccess: () => {
        void onSaved();
        reset(values);
        showToast('Account saved');
      },
    }),
  );
  return (
    <form noValidate className="flex flex-col gap-4" onSubmit={(event) => void submit(event)}>
      <TextField
        label="Name"
        hint="Stands in the ledger beside everything that you do."
        autoComplete="name"
        maxLength={LIMITS.name}
        error={errors.name?.message}
        {...register('name')}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField
          label="Loads in"
          options={LOAD_UNITS.map((value) => ({ value, label: LOAD_NAMES[value] }))}
          error={errors.loadUnit?.message}
          {...register('loadUnit')}
        />
        <SelectField
          label="Lengths in"
          options={LENGTH_UNITS.map((value) => ({ value, label: LENGTH_NAMES[value] }))}
          error={errors.lengthUnit?.message}
          {...register('lengthUnit')}
        />
      </div>
      <p className="text-[0.9375rem] text-muted">Loads are always rounded down.</p>
      <ProblemNotice problem={update.error} />
      {isDirty && (
        <Button type="submit" className="self-start" pending={update.isPending} pendingText="Saving">
          Save
        </Button>
      )}
    </form>
  );
}
