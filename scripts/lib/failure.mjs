// @ts-check
import path from 'node:path';

/** What stops a command, told in one sentence to the person at the terminal; nothing else of it is shown. */
export class Failure extends Error {}

/** A failure whose sentence the failing program has written itself. */
export class ToldFailure extends Failure {
  constructor() {
    super('');
  }
}

/** @type {[RegExp, string][]} */
const KNOWN_CAUSES = [
  [
    /ENOSPC|No space left on device|errno: 28\b|error 28\b/i,
    'The disk is full: free some space, then start again; what was saved before is kept.',
  ],
  [
    /EDQUOT|Disk quota exceeded/i,
    'The disk quota of this user is used up: free some space, then start again.',
  ],
  [
    /EROFS|Read-only file system/i,
    'The folder is on a read-only disk: move it to one that can be written to.',
  ],
  [
    /EMFILE|ENFILE|Too many open files/i,
    'Too many files are open on this machine: close some programs, then start again.',
  ],
];

/**
 * Finds the sentence for a cause that people can do something about.
 * @param {string} text an error message or the end of a program's output
 * @returns {string | null}
 */
export function findKnownCause(text) {
  return KNOWN_CAUSES.find(([pattern]) => pattern.test(text))?.[1] ?? null;
}

/**
 * One sentence for anything that was thrown, without its stack.
 * @param {unknown} error
 * @returns {string}
 */
export function explain(error) {
  if (error instanceof Failure) return error.message;
  const cause = /** @type {NodeJS.ErrnoException} */ (
    error instanceof Error ? error : new Error(String(error))
  );
  const known = findKnownCause(`${cause.code ?? ''} ${cause.message}`);
  if (known) return known;
  if ((cause.code === 'EACCES' || cause.code === 'EPERM') && cause.path)
    return `This user may not write to ${path.dirname(cause.path)}: give the folder to the user who starts Slingward, or start it as the one who did before.`;
  return `Something unexpected stopped the command: ${cause.message.split('\n')[0]}`;
}
