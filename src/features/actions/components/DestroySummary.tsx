import { useState, type FormEvent, type ReactNode } from 'react';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { FactList, Panel } from '../../../components/ui/Panel';
import { fileUrl } from '../../../config/paths';
import { toProblem } from '../../../lib/problem';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import { methodOf, type DestroyValues } from '../destroyValues';
import { toFates, type Part } from '../parts';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';

interface DestroySummaryProps extends ActFormProps {
  parts: readonly Part[];
  values: DestroyValues;
  onBack: () => void;
}

/** The last look before an act that can't be taken back, and the password that signs it. */
export function DestroySummary({
  sling,
  parts,
  values,
  onBack,
  onDone,
  onReload,
}: DestroySummaryProps): ReactNode {
  const act = useAct(sling, 'destroy');
  const [password, setPassword] = useState('');
  const [isAsked, setIsAsked] = useState(false);
  const { fittings, legs } = toFates(parts, values.fates);
  const salvaged = parts.filter((part) => part.isDetachable && values.fates[part.key] === 'salvaged');
  const passwordError = act.error ? toProblem(act.error).errorFor('password') : undefined;

  function sign(event: FormEvent): void {
    event.preventDefault();
    setIsAsked(true);
    if (password === '') return;
    act.mutate(
      {
        method: methodOf(values),
        photoIds: values.photoIds,
        fittings,
        ...(legs.length > 0 ? { legs } : {}),
        password,
      },
      { onSuccess: onDone },
    );
  }

  return (
    <form onSubmit={sign} noValidate className="flex flex-col gap-5">
      <Panel title={`Sling ${sling.number}: destroyed for good`} card>
        <FactList
          facts={[
            { term: 'How', value: methodOf(values) },
            {
              term: 'Kept of it',
              value: salvaged.length > 0 ? salvaged.map(({ name }) => name).join('; ') : 'Nothing',
            },
            { term: 'Parts destroyed', value: `${parts.length - salvaged.length} of ${parts.length}` },
            { term: 'Its label', value: 'Becomes void' },
          ]}
        />
        <ul className="mt-4 flex flex-wrap gap-2.5">
          {values.photoIds.map((id, i) => (
            <li key={id}>
              <img
                src={fileUrl(id)}
                alt={`Photo ${i + 1} of the destroyed sling`}
                className="size-28 rounded border border-rule object-cover"
              />
            </li>
          ))}
        </ul>
      </Panel>
      <TextField
        label="Your password, as your signature"
        type="password"
        autoComplete="current-password"
        value={password}
        onChange={(event) => setPassword(event.target.value)}
        error={isAsked && password === '' ? 'Your password is needed.' : passwordError}
        className="max-w-md"
      />
      <ActProblem problem={passwordError ? null : act.error} onReload={onReload} onDismiss={act.reset} />
      <ActionBar>
        <Button tone="quiet" onClick={onBack} disabled={act.isPending}>
          Back to change it
        </Button>
        <Button
          type="submit"
          tone="danger"
          pending={act.isPending}
          pendingText={ACTION_WORDS.destroy.pending}
        >
          {ACTION_WORDS.destroy.button}
        </Button>
      </ActionBar>
    </form>
  );
}
