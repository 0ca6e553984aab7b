import type { FieldError } from 'react-hook-form';
import type { z } from 'zod';

/** A fault in what was typed: where in the form, and what to do. */
export interface Fault {
  path: string;
  message: string;
}

/** Measures stand in the form as {figure, unit}; their faults belong to the figure. */
const MEASURE_PATH = /(^|\.)(kg|\w+Kg|\w+Mm)$/;

/** The form's field for a path of the request: `spec.chainMm` is `specs.alloy-chain.chainMm.figure`. */
export function toFormPath(path: string, kind: string): string {
  const own = path.startsWith('spec.') ? `specs.${kind}.${path.slice('spec.'.length)}` : path;
  return MEASURE_PATH.test(own) ? `${own}.figure` : own;
}

/** zod's issues as faults of the form, with words of ours where zod's own are for programmers. */
export function listFaults(issues: readonly z.core.$ZodIssue[], kind: string): Fault[] {
  return issues.map((issue) => ({
    path: toFormPath(issue.path.join('.'), kind),
    message: toWords(issue),
  }));
}

function toWords(issue: z.core.$ZodIssue): string {
  const isMissing = issue.input === undefined || issue.input === '';
  switch (issue.code) {
    case 'invalid_type':
      if (Number.isNaN(issue.input)) return 'A number, such as 3,150 or 3.15.';
      return issue.expected === 'number' ? 'Please fill this in.' : 'Please choose or fill this in.';
    case 'invalid_value':
    case 'invalid_union':
      return 'Please choose one.';
    case 'invalid_format':
      return isMissing ? 'Please give a date.' : issue.message;
    default:
      return issue.message;
  }
}

/** For a resolver: the first fault of each field, by its path. */
export function toFlatErrors(issues: readonly z.core.$ZodIssue[], kind = ''): Record<string, FieldError> {
  const flat: Record<string, FieldError> = {};
  for (const { path, message } of listFaults(issues, kind)) flat[path] ??= { type: 'rule', message };
  return flat;
}
