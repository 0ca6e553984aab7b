import { useMutation } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { useSession } from '../../../lib/session';

export function SignOutButton(): ReactNode {
  const { signOut } = useSession();
  const leave = useMutation({ mutationFn: signOut });
  return (
    <div className="flex flex-col gap-3">
      <ProblemNotice problem={leave.error} />
      <Button
        tone="quiet"
        className="self-start"
        pending={leave.isPending}
        pendingText="Signing out"
        onClick={() => leave.mutate()}
      >
        Sign out
      </Button>
    </div>
  );
}
