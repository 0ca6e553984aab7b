import { zodResolver } from '@hookform/resolvers/zod';
import { useState, type ReactNode } from 'react';
import { ROLE_NAMES, ROLES } from '../../../../shared/domain/access/roles';
import { createUserRequest, type CreateUserRequest } from '../../../../shared/schemas/people';
import type { Site } from '../../../../shared/schemas/places';
import { LIMITS } from '../../../../shared/limits';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { DateField, TextField } from '../../../components/ui/inputs';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { ChoiceTiles } from '../../../components/ui/Tiles';
import { useFormDraft } from '../../../lib/useFormDraft';
import { emptyToNull, ROLE_HINTS } from '../userForm';
import { DesignationFields } from './DesignationFields';

export interface UserFormProps {
  /** Name of the draft: one per account, one for a new person. */
  draftKey: string;
  initial: CreateUserRequest;
  sites: readonly Site[];
  isNew: boolean;
  /** One's own administrator role stays: somebody must be left who can give it back. */
  isSelf: boolean;
  problem: Error | null;
  isPending: boolean;
  onSubmit: (values: CreateUserRequest, done: () => void) => void;
}

export function UserForm(props: UserFormProps): ReactNode {
  const { draftKey, initial, sites, isNew, isSelf, problem, isPending, onSubmit } = props;
  const form = useFormDraft<CreateUserRequest>(draftKey, {
    resolver: zodResolver(createUserRequest),
    defaultValues: initial,
  });
  const { register, watch, setValue, handleSubmit, formState, clearDraft, reset, wasRestored } = form;
  const [isDraftShown, setDraftShown] = useState(wasRestored);
  const { errors } = formState;
  const roles = watch('roles');
  const siteIds = watch('siteIds');
  const submit = handleSubmit((values) => onSubmit(values, clearDraft));
  const change = { shouldDirty: true, shouldValidate: formState.isSubmitted } as const;

  return (
    <form
      noValidate
      className="grid gap-8 lg:grid-cols-2 lg:gap-x-12"
      onSubmit={(event) => void submit(event)}
    >
      {isDraftShown && (
        <Notice
          className="lg:col-span-2"
          title="Changes that were not saved are shown"
          action={
            <Button
              tone="quiet"
              onClick={() => {
                reset(initial);
                clearDraft();
                setDraftShown(false);
              }}
            >
              Start over
            </Button>
          }
        />
      )}
      <Panel title="Person">
        <div className="flex flex-col gap-4">
          <TextField
            label="Name"
            maxLength={LIMITS.name}
            error={errors.name?.message}
            {...register('name')}
          />
          <TextField
            label="E-mail"
            type="email"
            inputMode="email"
            autoCapitalize="none"
            readOnly={!isNew}
            hint={isNew ? 'They sign in with it.' : 'It can’t be changed: make a new account instead.'}
            error={errors.email?.message}
            {...register('email')}
          />
          <DateField
            label="Account ends on"
            optional={!roles.includes('auditor')}
            hint="Visiting inspectors, witnesses and auditors: the last day on which it works."
            error={errors.endsOn?.message}
            {...register('endsOn', { setValueAs: emptyToNull })}
          />
        </div>
      </Panel>
      <div className="flex flex-col gap-8">
        <Panel title="Roles">
          <ChoiceTiles
            legend="Roles"
            hideLegend
            columns={1}
            options={ROLES.map((role) => ({
              value: role,
              label: ROLE_NAMES[role],
              hint:
                isSelf && role === 'admin'
                  ? 'Your own: only another administrator can take it'
                  : ROLE_HINTS[role],
              disabled: isSelf && role === 'admin',
            }))}
            error={errors.roles?.message}
            selected={roles}
            input={{
              name: 'roles',
              onChange: ({ target }) =>
                setValue(
                  'roles',
                  ROLES.filter((role) => (role === target.value ? target.checked : roles.includes(role))),
                  change,
                ),
            }}
          />
        </Panel>
        <Panel title="Sites">
          <ChoiceTiles
            legend="Works at, and sees"
            options={sites.map(({ id, name }) => ({ value: String(id), label: name }))}
            error={errors.siteIds?.message}
            selected={siteIds.map(String)}
            input={{
              name: 'siteIds',
              onChange: ({ target }) =>
                setValue(
                  'siteIds',
                  target.checked
                    ? [...siteIds, Number(target.value)]
                    : siteIds.filter((id) => id !== Number(target.value)),
                  change,
                ),
            }}
          />
        </Panel>
      </div>
      {(roles.includes('inspector') || watch('designations').length > 0) && (
        <div className="lg:col-span-2">
          <DesignationFields form={form} />
        </div>
      )}
      <div className="lg:col-span-2">
        <ProblemNotice problem={problem} />
        <ActionBar>
          <Button type="submit" pending={isPending} pendingText="Saving">
            {isNew ? 'Make the account' : 'Save'}
          </Button>
        </ActionBar>
      </div>
    </form>
  );
}
