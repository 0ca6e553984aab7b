import { createContext, useContext } from 'react';
import type { Role } from '../../shared/domain/access/roles';
import { formatLength, formatLoad, type LengthUnit, type LoadUnit } from '../../shared/domain/units/units';
import type { SessionUser } from '../../shared/schemas/people';

export interface Session {
  /** Null on the few pages that need no sign-in. */
  user: SessionUser | null;
  /** Ends the session here and at the server, then shows sign-in. */
  signOut: () => Promise<void>;
  /** Asks the server again who is signed in (after signing in, or after changing one's account). */
  refresh: () => Promise<void>;
}

export const SessionContext = createContext<Session>({
  user: null,
  signOut: () => Promise.resolve(),
  refresh: () => Promise.resolve(),
});

export const useSession = (): Session => useContext(SessionContext);

/** The signed-in person; only inside the shell, where there always is one. @throws outside it */
export function useUser(): SessionUser {
  const { user } = useSession();
  if (!user) throw new Error('useUser outside the signed-in part of the app');
  return user;
}

export const hasRole = (user: Pick<SessionUser, 'roles'> | null, ...roles: Role[]): boolean =>
  user !== null && roles.some((role) => user.roles.includes(role));

export interface UnitFormat {
  load: LoadUnit;
  length: LengthUnit;
  /** kg in, text in the person's unit out, rounded down. */
  formatLoad: (kg: number) => string;
  /** mm in, text in the person's unit out. */
  formatLength: (mm: number) => string;
}

/** Loads and lengths as this person reads them; kg and m for visitors. */
export function useUnits(): UnitFormat {
  const { user } = useSession();
  const load = user?.loadUnit ?? 'kg';
  const length = user?.lengthUnit ?? 'm';
  return {
    load,
    length,
    formatLoad: (kg) => formatLoad(kg, load),
    formatLength: (mm) => formatLength(mm, length),
  };
}
