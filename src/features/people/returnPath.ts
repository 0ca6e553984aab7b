/** Where to go after signing in: only a path of this app, never another site. */
export function safeReturnPath(to: string | null): string {
  return to && /^\/(?![/\\])/.test(to) ? to : '/';
}
