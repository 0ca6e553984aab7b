import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { acceptInvitationRequest } from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { useAcceptInvitation } from '../api/session';
import { PasswordField } from './PasswordField';

/** Sets the password of the account that the link belongs to. */
export function InvitationForm({
  token,
  email,
  onDone,
}: {
  token: string;
  email: string;
  onDone: () => Promise<void>;
}): ReactNode {
  const { register, handleSubmit, formState } = useForm<z.infer<typeof acceptInvitationRequest>>({
    resolver: zodResolver(acceptInvitationRequest),
    defaultValues: { password: '' },
  });
  const accept = useAcceptInvitation(token);
  const submit = handleSubmit(({ password }) => accept.mutate(password, { onSuccess: () => void onDone() }));
  return (
    <form noValidate className="flex flex-col gap-4" onSubmit={(event) => void submit(event)}>
      {/* Password managers keep the pair only when the name stands in the form */}
      <TextField label="E-mail" type="email" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="New password"
        hint={`At least ${LIMITS.password.min} characters; a few words in a row are easy to keep in mind.`}
        autoComplete="new-password"
        error={formState.errors.password?.message}
        {...register('password')}
      />
      <ProblemNotice problem={accept.error} />
      <Button type="submit" wide pending={accept.isPending} pendingText="Saving">
        Save the password
      </Button>
    </form>
  );
}
