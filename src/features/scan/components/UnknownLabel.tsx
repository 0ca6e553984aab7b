import type { ReactNode } from 'react';
import { ScanAnswer } from '../../../components/sling/ScanAnswer';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button, LinkButton } from '../../../components/ui/Button';
import { TagCode } from '../../../components/ui/TagCode';
import { paths } from '../../../config/paths';
import type { Reading } from '../reading';

/** A well-formed code that this store never gave (or gave where this person doesn't work). */
export function UnknownLabel({
  reading,
  onNext,
  Layout,
}: {
  reading: Reading;
  onNext: () => void;
  Layout: (props: { band: ReactNode; children: ReactNode }) => ReactNode;
}): ReactNode {
  const isElsewhere = reading.host !== null && reading.host !== window.location.host.toLowerCase();
  return (
    <Layout
      band={
        <ScanAnswer
          mayUse={false}
          title="This label is unknown here"
          lines={[<TagCode key="code" code={reading.code} className="text-[1.375rem]" />]}
        />
      }
    >
      <p>
        {reading.via === 'typed'
          ? 'Compare the code with the label once more: two characters that changed places can slip through.'
          : isElsewhere
            ? `The label carries the address ${reading.host}: it may belong to another store.`
            : 'The code is well formed, but no label with it was ever printed here.'}{' '}
        Set the sling aside, find its record by serial or number, and print it a new label.
      </p>
      <ActionBar>
        <LinkButton tone="quiet" to={paths.slings()}>
          Find it in the register
        </LinkButton>
        <Button onClick={onNext}>Scan next</Button>
      </ActionBar>
    </Layout>
  );
}
