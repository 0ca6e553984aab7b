import { Suspense, type ReactNode } from 'react';
import { Link, Outlet } from 'react-router-dom';
import { SkeletonLines } from '../components/ui/states';
import { Toaster } from '../components/ui/Toast';
import { paths } from '../config/paths';

/** Pages before sign-in: the name, a narrow column, nothing else. */
export function PlainLayout(): ReactNode {
  return (
    <div className="min-h-dvh">
      <header className="mx-auto flex max-w-md items-center px-4 pt-8 pb-4">
        <Link to={paths.home} className="flex min-h-12 items-center gap-3 text-xl font-bold">
          <img src="/favicon.svg" alt="" className="size-9" />
          Slingward
        </Link>
      </header>
      <main id="page" className="mx-auto max-w-md px-4 pb-16">
        <Suspense fallback={<SkeletonLines lines={5} />}>
          <Outlet />
        </Suspense>
      </main>
      <Toaster />
    </div>
  );
}
