import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { setUpRequest, type SetUpRequest } from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { SelectField, TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { RadioTiles } from '../../../components/ui/Tiles';
import { useFormDraft } from '../../../lib/useFormDraft';
import { useSetUp } from '../api/session';
import { findOwnTimeZone, listTimeZones } from '../../../lib/timeZones';
import { PasswordField } from './PasswordField';

const NEVER_KEPT = ['password'] as const;
const ZONES = listTimeZones().map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }));

/** The first administrator and the first site, once. */
export function SetUpForm({ onDone }: { onDone: () => Promise<void> }): ReactNode {
  const form = useFormDraft<SetUpRequest>(
    'set-up',
    {
      resolver: zodResolver(setUpRequest),
      defaultValues: {
        name: '',
        email: '',
        password: '',
        siteName: '',
        timeZone: findOwnTimeZone(),
        ruleSets: 'us',
      },
    },
    NEVER_KEPT,
  );
  const { errors } = form.formState;
  const setUp = useSetUp();
  const submit = form.handleSubmit((values) =>
    setUp.mutate(values, {
      onSuccess: () => {
        form.clearDraft();
        void onDone();
      },
    }),
  );
  return (
    <form noValidate className="flex flex-col gap-8" onSubmit={(event) => void submit(event)}>
      <Panel title="You, the first administrator">
        <div className="flex flex-col gap-4">
          <TextField
            label="Name"
            autoComplete="name"
            maxLength={LIMITS.name}
            error={errors.name?.message}
            {...form.register('name')}
          />
          <TextField
            label="E-mail"
            type="email"
            inputMode="email"
            autoComplete="username"
            autoCapitalize="none"
            error={errors.email?.message}
            {...form.register('email')}
          />
          <PasswordField
            label="Password"
            hint={`At least ${LIMITS.password.min} characters; a few words in a row are easy to keep in mind.`}
            autoComplete="new-password"
            error={errors.password?.message}
            {...form.register('password')}
          />
        </div>
      </Panel>
      <Panel title="The first site">
        <div className="flex flex-col gap-4">
          <TextField
            label="Site name"
            hint="Where the slings are kept, as people call it. Racks and a cage are made with it; more come later."
            maxLength={LIMITS.shortText}
            error={errors.siteName?.message}
            {...form.register('siteName')}
          />
          <SelectField
            label="Time zone"
            options={ZONES}
            error={errors.timeZone?.message}
            {...form.register('timeZone')}
          />
          <RadioTiles
            legend="Inspected by the rules of"
            columns={1}
            options={[
              { value: 'us', label: 'United States', hint: 'OSHA and ASME B30; loads in pounds' },
              {
                value: 'uk_eu',
                label: 'United Kingdom and Europe',
                hint: 'EN standards and LOLER; loads in kilograms',
              },
            ]}
            error={errors.ruleSets?.message}
            input={form.register('ruleSets')}
          />
        </div>
      </Panel>
      <ProblemNotice problem={setUp.error} />
      <Button type="submit" wide pending={setUp.isPending} pendingText="Setting up">
        Set up the store
      </Button>
    </form>
  );
}
