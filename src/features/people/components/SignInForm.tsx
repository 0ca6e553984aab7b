import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { signInRequest, type SignInRequest } from '../../../../shared/schemas/people';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { ApiProblem } from '../../../lib/apiClient';
import { useSignIn } from '../api/session';
import { PasswordField } from './PasswordField';

export function SignInForm({ onSignedIn }: { onSignedIn: () => Promise<void> }): ReactNode {
  const { register, handleSubmit, formState } = useForm<SignInRequest>({
    resolver: zodResolver(signInRequest),
    defaultValues: { email: '', password: '' },
  });
  const signIn = useSignIn();
  const { errors } = formState;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) =>
        void handleSubmit((values) => signIn.mutate(values, { onSuccess: () => void onSignedIn() }))(event)
      }
    >
      <TextField
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="username"
        autoCapitalize="none"
        error={errors.email?.message}
        {...register('email')}
      />
      <PasswordField
        label="Password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register('password')}
      />
      <SignInFailure problem={signIn.error} />
      <Button type="submit" wide pending={signIn.isPending} pendingText="Signing in">
        Sign in
      </Button>
    </form>
  );
}

function SignInFailure({ problem }: { problem: Error | null }): ReactNode {
  if (problem instanceof ApiProblem && problem.status === 401) {
    return (
      <Notice tone="error" title="E-mail and password don’t match an account">
        Check both and try again. An administrator can make you a link to set a new password, and can tell
        whether your account has ended.
      </Notice>
    );
  }
  return <ProblemNotice problem={problem} />;
}
