import { Suspense, useCallback, useEffect, useRef, type ReactNode } from 'react';
import { NavLink, Outlet, ScrollRestoration, useLocation, useNavigate } from 'react-router-dom';
import type { SessionUser } from '../../shared/schemas/people';
import { SkeletonLines } from '../components/ui/states';
import { Toaster } from '../components/ui/Toast';
import { paths } from '../config/paths';
import { cx } from '../lib/cx';
import { useHandheldScanner, useSlashKey } from '../lib/handheldScanner';
import { hasRole, useSession } from '../lib/session';
import { NAV_ITEMS, scanDrawing, type NavItem } from './navigation';
import { RequireUser } from './SessionGate';

/** The signed-in part: skip link, rail or bottom bar, the page, and the scanner that works anywhere. */
export function Shell(): ReactNode {
  const { user } = useSession();
  return (
    <RequireUser user={user}>
      <SignedIn user={user} />
    </RequireUser>
  );
}

function SignedIn({ user }: { user: SessionUser | null }): ReactNode {
  const navigate = useNavigate();
  const openScan = useCallback((text?: string) => void navigate(paths.scan(text)), [navigate]);
  useHandheldScanner(openScan, { fallback: true });
  useSlashKey(openScan);
  const main = useFocusOnNavigation();
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[5.5rem_1fr]">
      <a
        href="#page"
        className="fixed top-2 left-2 z-50 -translate-y-20 rounded bg-petrol px-4 py-3 font-semibold text-petrol-ink focus:translate-y-0"
      >
        Skip to the page
      </a>
      <Rail user={user} />
      <main
        id="page"
        ref={main}
        tabIndex={-1}
        className="mx-auto w-full max-w-[80rem] min-w-0 px-4 pt-3 pb-32 outline-none sm:px-6 lg:px-8 lg:pt-5 lg:pb-12"
      >
        <Suspense fallback={<SkeletonLines lines={6} />}>
          <Outlet />
        </Suspense>
      </main>
      <BottomBar user={user} />
      <Toaster />
      <ScrollRestoration getKey={(location) => location.pathname + location.search} />
    </div>
  );
}

/** After a change of page the reader starts at its top, as after a load; not on the first page, nor for a filter. */
function useFocusOnNavigation(): React.RefObject<HTMLElement | null> {
  const ref = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    ref.current?.focus({ preventScroll: true });
  }, [pathname]);
  return ref;
}

function visibleItems(items: readonly NavItem[], user: SessionUser | null): readonly NavItem[] {
  return items.filter((item) => !item.roles || hasRole(user, ...item.roles));
}

function Rail({ user }: { user: SessionUser | null }): ReactNode {
  const { left, right, railOnly } = NAV_ITEMS;
  return (
    <nav
      aria-label="Main"
      className="no-print sticky top-0 hidden h-dvh flex-col items-stretch border-r border-rule bg-card lg:flex"
    >
      <NavLink to={paths.home} aria-label="Slingward, home" className="grid h-16 place-items-center">
        <img src="/favicon.svg" alt="" className="size-9" />
      </NavLink>
      <NavLink
        to={paths.scan()}
        title="Scan (press /)"
        className="mx-2.5 mb-2 flex flex-col items-center gap-0.5 rounded-xl bg-petrol py-2.5 font-semibold text-petrol-ink hover:brightness-110"
      >
        <span className="size-7">{scanDrawing}</span>
        Scan
      </NavLink>
      {visibleItems([...left, ...right, ...railOnly], user).map((item) => (
        <NavLink
          key={item.to}
          to={item.to}
          className={({ isActive }) =>
            cx(
              'flex flex-col items-center gap-0.5 py-2.5 text-[0.875rem]',
              isActive
                ? 'font-semibold text-petrol shadow-[inset_3px_0_0_var(--petrol)]'
                : 'font-medium text-muted hover:bg-wash hover:text-ink',
            )
          }
        >
          <span className="size-7">{item.drawing}</span>
          {item.label}
        </NavLink>
      ))}
    </nav>
  );
}

function BottomBar({ user }: { user: SessionUser | null }): ReactNode {
  return (
    <nav
      aria-label="Main"
      className="no-print fixed inset-x-0 bottom-0 z-30 grid grid-cols-[1fr_1fr_5.25rem_1fr_1fr] items-end border-t border-rule bg-card pb-[env(safe-area-inset-bottom)] lg:hidden"
    >
      {visibleItems(NAV_ITEMS.left, user).map((item) => (
        <BarLink key={item.to} item={item} />
      ))}
      <NavLink
        to={paths.scan()}
        className="mx-auto -mt-6 mb-1.5 flex size-[4.5rem] flex-col items-center justify-center rounded-2xl bg-petrol text-[0.9375rem] leading-tight font-semibold text-petrol-ink shadow-[var(--shadow)]"
      >
        <span className="size-8">{scanDrawing}</span>
        Scan
      </NavLink>
      {visibleItems(NAV_ITEMS.right, user).map((item) => (
        <BarLink key={item.to} item={item} />
      ))}
    </nav>
  );
}

function BarLink({ item }: { item: NavItem }): ReactNode {
  return (
    <NavLink
      to={item.to}
      className={({ isActive }) =>
        cx(
          'flex h-16 flex-col items-center justify-center gap-0.5 text-[0.875rem]',
          isActive
            ? 'font-semibold text-petrol shadow-[inset_0_3px_0_var(--petrol)]'
            : 'font-medium text-muted',
        )
      }
    >
      <span className="size-6.5">{item.drawing}</span>
      {item.label}
    </NavLink>
  );
}
