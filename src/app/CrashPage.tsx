import type { ReactNode } from 'react';
import { Button } from '../components/ui/Button';
import { Notice } from '../components/ui/Notice';
import { usePageTitle } from '../components/ui/PageHeader';

/** Something in the client broke: what happened, what is kept, what to do. */
export function CrashPage(): ReactNode {
  usePageTitle('This page stopped working');
  return (
    <main className="mx-auto max-w-xl p-4 pt-10">
      <h1 className="sr-only">This page stopped working</h1>
      <Notice
        tone="error"
        title="This page stopped working"
        action={<Button onClick={() => window.location.reload()}>Load it again</Button>}
      >
        Whatever was saved is kept, and forms keep what you typed. Until it works again, go by the maker’s tag
        and by eye: when in doubt, don’t use the sling.
      </Notice>
    </main>
  );
}
