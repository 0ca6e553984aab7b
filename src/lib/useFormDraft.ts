import { useEffect, useState } from 'react';
import {
  useForm,
  type DefaultValues,
  type FieldValues,
  type UseFormProps,
  type UseFormReturn,
} from 'react-hook-form';
import { z } from 'zod';
import { clearDraft, readDraft, writeDraft } from './draft';

const looseDraft = z.record(z.string(), z.unknown());

/**
 * `useForm` whose values survive a reload under `key`; call `clear` after the submit succeeded. Values left out by name
 * (`omit`, passwords above all) are never kept.
 */
export function useFormDraft<T extends FieldValues>(
  key: string,
  props: UseFormProps<T> & { defaultValues: DefaultValues<T> },
  omit: readonly string[] = [],
): UseFormReturn<T> & { clearDraft: () => void; wasRestored: boolean } {
  const [kept] = useState(() => readDraft(key, looseDraft));
  const form = useForm<T>({ ...props, defaultValues: { ...props.defaultValues, ...kept } });
  const { subscribe } = form;
  useEffect(
    () =>
      subscribe({
        formState: { values: true },
        callback: ({ values }) => {
          const safe = Object.entries(values).filter(([name]) => !omit.includes(name));
          writeDraft(key, Object.fromEntries(safe));
        },
      }),
    [key, omit, subscribe],
  );
  return { ...form, clearDraft: () => clearDraft(key), wasRestored: kept !== null };
}
