import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { changePasswordRequest } from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { showToast } from '../../../components/ui/Toast';
import { useChangePassword, type ChangePasswordRequest } from '../api/account';
import { PasswordField } from './PasswordField';

export function PasswordForm({ email }: { email: string }): ReactNode {
  const { register, handleSubmit, formState, reset } = useForm<ChangePasswordRequest>({
    resolver: zodResolver(changePasswordRequest),
    defaultValues: { currentPassword: '', newPassword: '' },
  });
  const { errors } = formState;
  const change = useChangePassword();
  const submit = handleSubmit((values) =>
    change.mutate(values, {
      onSuccess: () => {
        reset();
        showToast('Password changed');
      },
    }),
  );
  return (
    <form noValidate className="flex flex-col gap-3" onSubmit={(event) => void submit(event)}>
      <input type="email" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        label="Password now"
        autoComplete="current-password"
        error={errors.currentPassword?.message}
        {...register('currentPassword')}
      />
      <PasswordField
        label="New password"
        hint={`At least ${LIMITS.password.min} characters; a few words in a row are easy to keep in mind.`}
        autoComplete="new-password"
        error={errors.newPassword?.message}
        {...register('newPassword')}
      />
      <ProblemNotice problem={change.error} />
      <Button
        type="submit"
        tone="quiet"
        className="self-start"
        pending={change.isPending}
        pendingText="Saving"
      >
        Change the password
      </Button>
    </form>
  );
}
